import { fireEvent, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { PlanReader } from '@/features/plan';
import { WheelPage } from '@/features/wheels/components/wheel-page';
import type { WheelLife } from '@/shared/contracts/wheel-entries';
import type { Role } from '@/shared/domain/people';

import { serve, showInShop, type Asked } from './in-shop';
import { entry, WHEEL_ID } from './wheel-page';

/** Answers with a life, and takes every entry. */
export const taking =
  (life: WheelLife) =>
  ({ method, body }: Asked) => {
    if (method === 'GET') return { body: life };
    const { id, step } = body as {
      id: string;
      step: WheelLife['entries']['items'][number]['step'];
    };
    return { status: 201, body: { wheel: life.wheel, entry: { ...entry(9, step), id } } };
  };

/** Opens the page of the wheel, and answers once it stands. */
export async function show(
  life: WheelLife,
  role: Role = 'machinist',
  api: Parameters<typeof serve>[0] = taking(life),
) {
  const log = serve(api);
  showInShop(
    <PlanReader units="mm">
      <WheelPage wheelId={WHEEL_ID} />
    </PlanReader>,
    { role },
  );
  await screen.findByRole('heading', { name: 'Next' });
  return { log, user: userEvent.setup() };
}

export const button = (name: string | RegExp) => screen.getByRole('button', { name });
export const sent = (log: Asked[]) => log.filter(({ method }) => method === 'POST');
export const fill = (name: string, text: string) =>
  fireEvent.change(screen.getByRole('textbox', { name }), { target: { value: text } });
