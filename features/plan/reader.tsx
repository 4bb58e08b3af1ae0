import { createContext, useCallback, useContext, useMemo, useState, type ReactNode } from 'react';

import type { UnitSystem } from '@/shared/domain/people';
import type { Figure } from '@/shared/rules';
import type { FormatOptions } from '@/shared/units/format';
import { WorkingSheet } from '@/features/ui/working-sheet';

import { workingProps } from './figure-text';

interface Reader {
  units: UnitSystem;
  showWorking: (title: string, figure: Figure, options?: FormatOptions) => void;
}

const ReaderContext = createContext<Reader | null>(null);

interface Shown {
  title: string;
  figure: Figure;
  options?: FormatOptions;
}

/** Whoever reads a plan: their units, and the sheet in which a pressed figure opens its working. */
export function PlanReader({ units, children }: { units: UnitSystem; children: ReactNode }) {
  const [shown, setShown] = useState<Shown | null>(null);
  const [open, setOpen] = useState(false);
  const showWorking = useCallback((title: string, figure: Figure, options?: FormatOptions) => {
    setShown({ title, figure, ...(options ? { options } : {}) });
    setOpen(true);
  }, []);
  const reader = useMemo(() => ({ units, showWorking }), [units, showWorking]);
  return (
    <ReaderContext value={reader}>
      {children}
      {shown ? (
        <WorkingSheet
          title={shown.title}
          open={open}
          onClose={() => setOpen(false)}
          {...workingProps(shown.figure, units, shown.options)}
        />
      ) : null}
    </ReaderContext>
  );
}

export function useReader(): Reader {
  const reader = useContext(ReaderContext);
  if (!reader) throw new Error('useReader stands outside a PlanReader');
  return reader;
}
