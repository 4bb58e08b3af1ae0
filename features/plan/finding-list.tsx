import { findingWords, type Finding } from '@/shared/rules';
import { FindingCard } from '@/features/ui/finding-card';

import { quantityText, sourceWords } from './figure-text';
import { useReader } from './reader';

interface FindingListProps {
  findings: readonly Finding[];
  /** Names the source under each finding. */
  sourced?: boolean;
  /** Set large over the first finding: "too fast". */
  headline?: string;
}

/** Findings in words: what is known, why it matters, what to do next. */
export function FindingList({ findings, sourced = false, headline }: FindingListProps) {
  const { units } = useReader();
  return findings.map((finding, index) => {
    const { title, remedy } = findingWords(finding, quantityText(units));
    const { title: source, place, mark } = sourceWords(finding.source);
    return (
      <FindingCard
        key={`${finding.code}-${index}`}
        level={finding.level}
        {...(headline && index === 0 ? { headline } : {})}
        {...(sourced ? { source: `${[source, place].filter(Boolean).join(', ')}. ${mark}.` } : {})}
      >
        {`${title} ${remedy}`}
      </FindingCard>
    );
  });
}
