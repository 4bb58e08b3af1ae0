import type { ComponentProps } from 'react';

import type { Figure } from '@/shared/rules';
import type { FormatOptions } from '@/shared/units/format';
import { ListRow } from '@/features/ui/list-row';
import { Readout } from '@/features/ui/readout';
import { Strong } from '@/features/ui/text';

import { bandText, figureNumber, figureText, figureUnit } from './figure-text';
import { useReader } from './reader';

interface FigureReadoutProps extends Pick<ComponentProps<typeof Readout>, 'size' | 'on'> {
  label: string;
  figure: Figure;
  options?: FormatOptions;
  /** Set in place of the number: the name of a belt step. */
  value?: string | null;
  unit?: string;
}

/** A figure of a plan as a readout; one press opens its working. */
export function FigureReadout({
  label,
  figure,
  options,
  value,
  unit,
  ...rest
}: FigureReadoutProps) {
  const { units, showWorking } = useReader();
  return (
    <Readout
      {...rest}
      label={label}
      value={value === undefined ? figureNumber(figure, units, options) : value}
      unit={unit ?? figureUnit(figure, units)}
      onPress={() => showWorking(label, figure, options)}
    />
  );
}

/** A figure of a plan as a row of a list; one press opens its working. */
export function FigureRow({
  label,
  figure,
  options,
  detail,
}: Pick<FigureReadoutProps, 'label' | 'figure' | 'options'> & { detail?: string }) {
  const { units, showWorking } = useReader();
  const shown = detail ?? bandText(figure, units);
  return (
    <ListRow
      label={label}
      {...(shown ? { detail: shown } : {})}
      aside={<Strong>{figureText(figure, units, options)}</Strong>}
      onPress={() => showWorking(label, figure, options)}
    />
  );
}
