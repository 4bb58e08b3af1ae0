import { act, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { PaletteSwitch } from '@/features/ui/palette-switch';
import { ThemeProvider, useTheme } from '@/features/ui/theme';

let dark = false;
let tell = () => {};

beforeEach(() => {
  dark = false;
  window.localStorage.clear();
  window.matchMedia = (query: string) =>
    ({
      get matches() {
        return query.includes('dark') && dark;
      },
      media: query,
      addEventListener: (_: string, listener: () => void) => {
        tell = listener;
      },
      removeEventListener: () => {},
    }) as unknown as MediaQueryList; // jsdom has none
});

function Palette() {
  return <p>{useTheme().palette}</p>;
}

const show = () =>
  render(
    <ThemeProvider>
      <PaletteSwitch />
      <Palette />
    </ThemeProvider>,
  );

describe('the palette', () => {
  it('follows the system until the reader chooses', () => {
    show();
    expect(screen.getByText('day', { selector: 'p' })).toBeVisible();
    dark = true;
    act(() => tell());
    expect(screen.getByText('night', { selector: 'p' })).toBeVisible();
    expect(document.documentElement).not.toHaveAttribute('data-palette');
  });

  it('is put on the page and remembered when chosen', async () => {
    const { unmount } = show();
    await userEvent.click(screen.getByRole('radio', { name: 'night' }));
    expect(document.documentElement).toHaveAttribute('data-palette', 'night');
    expect(window.localStorage.getItem('ringtrue.palette')).toBe('night');
    unmount();

    show();
    expect(screen.getByRole('radio', { name: 'night' })).toBeChecked();
    await userEvent.click(screen.getByRole('radio', { name: 'as the system' }));
    expect(document.documentElement).not.toHaveAttribute('data-palette');
  });

  it('can be chosen where the browser stores nothing', async () => {
    const refuse = jest.spyOn(Storage.prototype, 'setItem').mockImplementation(() => {
      throw new Error('refused');
    });
    show();
    await userEvent.click(screen.getByRole('radio', { name: 'night' }));
    expect(screen.getByText('night', { selector: 'p' })).toBeVisible();
    refuse.mockRestore();
    await userEvent.click(screen.getByRole('radio', { name: 'as the system' }));
  });
});
