import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { configure, render } from '@testing-library/react';
import type { ReactNode } from 'react';

import { ShopProvider } from '@/features/session';
import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import type { Role, UnitSystem } from '@/shared/domain/people';

// Asking jsdom of each element whether it is shown takes seconds on a long form.
configure({ defaultHidden: true, asyncUtilTimeout: 10_000 });

export const SHOP_ID = '0190a000-0000-7000-8000-000000000001';
export const PERSON_ID = '0190a000-0000-7000-8000-000000000002';
const TIME = '2026-03-01T10:00:00Z';

export const shop = {
  id: SHOP_ID,
  version: 1,
  createdAt: TIME,
  updatedAt: TIME,
  name: 'Larkrise Tool Room',
  units: 'mm' as UnitSystem,
  timeZone: 'Europe/London',
  rules: DEFAULT_SHOP_RULES,
};

export const stored = { version: 1, createdAt: TIME, updatedAt: TIME };

interface Reply {
  status?: number;
  body?: unknown;
}
export interface Asked {
  method: string;
  path: string;
  body: unknown;
}
type Api = (asked: Asked) => Reply | 'no network';

// jsdom has no such signals; nothing here is ever aborted.
AbortSignal.timeout ??= () => new AbortController().signal;
AbortSignal.any ??= () => new AbortController().signal;

/** Answers every request of the page; the returned list grows with what was asked. */
export function serve(api: Api): Asked[] {
  const log: Asked[] = [];
  globalThis.fetch = jest.fn((input: RequestInfo | URL, init?: RequestInit) => {
    const asked: Asked = {
      method: init?.method ?? 'GET',
      path: String(input).replace(`/api/shops/${SHOP_ID}`, ''),
      body: typeof init?.body === 'string' ? (JSON.parse(init.body) as unknown) : undefined,
    };
    log.push(asked);
    const reply = api(asked);
    if (reply === 'no network') return Promise.reject(new TypeError('Failed to fetch'));
    const { status = 200, body = {} } = reply;
    const response = { ok: status < 400, status, json: () => Promise.resolve(body) };
    // The page reads no more of a response than this.
    return Promise.resolve(response as Response);
  });
  return log;
}

export const refusal = (status: number, code: string, more: object = {}): Reply => ({
  status,
  body: { type: `/problems/${code}`, title: code, status, code, ...more },
});

interface Place {
  role?: Role;
  shops?: { shopId: string; shopName: string; role: Role }[];
}

/** Shows a screen to a person of the shop. */
export function showInShop(screen: ReactNode, { role = 'machinist', shops }: Place = {}) {
  const client = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  const memberships = shops ?? [{ shopId: SHOP_ID, shopName: shop.name, role }];
  const person = { personId: PERSON_ID, name: 'Ada Quill', email: 'ada@example.com', memberships };
  return render(
    <QueryClientProvider client={client}>
      <ShopProvider shop={shop} person={person} role={role}>
        {screen}
      </ShopProvider>
    </QueryClientProvider>,
  );
}
