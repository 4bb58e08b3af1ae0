import { View } from 'react-native';

import { Small } from '@/features/ui/text';
import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import type { Resting, RestingSetting } from '@/shared/rules/rests-on';
import { entryText, formatQuantity } from '@/shared/units/format';

/** Figures and names are set into a finding's words when it is raised; here dots stand for them. */
const asWritten = (words: string) => words.replace(/\{\w+\}/g, '…');

function settingWords({ label, key, unit }: RestingSetting): string {
  const value = DEFAULT_SHOP_RULES[key];
  const decimals = entryText(value, unit, 'mm').split('.')[1]?.length ?? 0;
  const start = formatQuantity({ value, unit }, 'mm', { digits: decimals });
  return `${label}: a shop setting that starts at ${start}.`;
}

/** What of the product rests on a source. */
export function RestingWords({ resting }: { resting: Resting }) {
  const { figures, findings, cautions, settings } = resting;
  const lines = [
    ...(figures.length > 0 ? [`Figures: ${figures.join(', ')}.`] : []),
    ...settings.map(settingWords),
    ...findings.map((words) => `Finding: ${asWritten(words)}`),
    ...cautions.map((words) => `Caution: ${words}`),
  ];
  if (lines.length === 0)
    return <Small>Read for comparison; nothing is worked out from it alone.</Small>;
  return (
    <View role="list" aria-label="What rests on it">
      {lines.map((line) => (
        <View key={line} role="listitem">
          <Small tone="text">{line}</Small>
        </View>
      ))}
    </View>
  );
}
