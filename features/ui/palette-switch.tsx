import { Segmented } from './segmented';
import { PALETTE_CHOICES, useTheme } from './theme';

const WORDS = { system: 'as the system', day: 'day', night: 'night' } as const;

/** Chooses the palette; stands where a person keeps their own settings. */
export function PaletteSwitch() {
  const { choice, choose } = useTheme();
  return (
    <Segmented
      name="palette"
      label="Colours"
      value={choice}
      onChange={choose}
      options={PALETTE_CHOICES.map((value) => ({ value, label: WORDS[value] }))}
    />
  );
}
