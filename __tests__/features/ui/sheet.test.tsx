import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';

import { Button } from '@/features/ui/button';
import { Select } from '@/features/ui/select';
import { Sheet } from '@/features/ui/sheet';
import { WorkingSheet } from '@/features/ui/working-sheet';

beforeAll(() => {
  // Without an animation to wait for, a sheet opens and closes at once, as for readers who want no movement.
  window.matchMedia = (query: string) =>
    ({
      matches: query.includes('reduced-motion'),
      media: query,
      addEventListener: () => {},
      removeEventListener: () => {},
    }) as unknown as MediaQueryList; // jsdom has none
});

function Page() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button label="All cautions" onPress={() => setOpen(true)} />
      <Sheet open={open} onClose={() => setOpen(false)} title="Cautions">
        <Button label="First" />
        <Button label="Last" />
      </Sheet>
    </>
  );
}

describe('a sheet', () => {
  it('is a named dialog that takes the focus and keeps it', async () => {
    render(<Page />);
    await userEvent.click(screen.getByRole('button', { name: 'All cautions' }));
    const dialog = await screen.findByRole('dialog', { name: 'Cautions' });
    await waitFor(() => expect(dialog).toContainElement(document.activeElement as HTMLElement));
    for (let press = 0; press < 8; press += 1) {
      await userEvent.tab();
      expect(document.activeElement).not.toBe(
        screen.getByRole('button', { name: 'All cautions', hidden: true }),
      );
    }
  });

  it('closes with Escape and gives the focus back', async () => {
    render(<Page />);
    const opener = screen.getByRole('button', { name: 'All cautions' });
    await userEvent.click(opener);
    await screen.findByRole('dialog');
    await userEvent.keyboard('{Escape}');
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(opener).toHaveFocus();
  });

  it('closes with its button', async () => {
    render(<Page />);
    await userEvent.click(screen.getByRole('button', { name: 'All cautions' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Close' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
  });
});

describe('a choice from a list', () => {
  it('shows its value, opens, and closes on a choice', async () => {
    const onChange = jest.fn();
    render(
      <Select
        name="lathe"
        label="Lathe"
        value="one"
        onChange={onChange}
        options={[
          { value: 'one', label: 'Lathe 3' },
          { value: 'two', label: 'Old lathe' },
        ]}
      />,
    );
    await userEvent.click(screen.getByRole('button', { name: 'Lathe Lathe 3' }));
    await userEvent.click(await screen.findByRole('radio', { name: 'Old lathe' }));
    expect(onChange).toHaveBeenCalledWith('two');
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
  });
});

describe('a working', () => {
  it('shows formula, values, what is missing, and the source', async () => {
    render(
      <WorkingSheet
        open
        onClose={() => {}}
        title="Limit from the marked speed"
        formula="{N} = 60 000 {v} / (π {D})"
        terms={[
          { symbol: 'v', meaning: 'Marked speed', value: '25', unit: 'm/s' },
          { symbol: 'D', meaning: 'Diameter when new', value: null, unit: 'mm', assumed: true },
        ]}
        result={null}
        source="29 CFR 1910.215(d)(1)"
        mark="Law"
      />,
    );
    const dialog = await screen.findByRole('dialog', { name: 'Limit from the marked speed' });
    expect(dialog).toHaveTextContent('N = 60 000 v / (π D)');
    expect(dialog).toHaveTextContent('= 60 000 × 25 / (π × ?) = ?');
    expect(screen.getByRole('list', { name: 'Values in the formula' })).toHaveTextContent(
      /Diameter when new.*assumed.*missing/,
    );
    expect(dialog).toHaveTextContent('29 CFR 1910.215(d)(1)');
  });
});
