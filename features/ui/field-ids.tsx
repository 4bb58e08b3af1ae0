import { createContext, useContext } from 'react';
import type { ReactNode } from 'react';

const FieldScope = createContext('field');

/** Keeps two forms on one page apart: their fields may share names. */
export function FieldScopeProvider({ scope, children }: { scope: string; children: ReactNode }) {
  return <FieldScope value={scope}>{children}</FieldScope>;
}

export interface FieldIds {
  input: string;
  label: string;
  hint: string;
  error: string;
}

const idsOf = (scope: string, name: string): FieldIds => {
  const input = `${scope}-${name.replace(/[^\w-]/g, '-')}`;
  return { input, label: `${input}-label`, hint: `${input}-hint`, error: `${input}-error` };
};

/** Ids that tie a field's input, label, hint and error together, by the field's name. */
export function useFieldIds(name: string): FieldIds {
  return idsOf(useContext(FieldScope), name);
}

/** The same for any name, for links to fields from an error summary. */
export function useFieldIdsOf(): (name: string) => FieldIds {
  const scope = useContext(FieldScope);
  return (name) => idsOf(scope, name);
}

/** For `aria-describedby`: the hint and the error that are shown. */
export function describedBy(ids: FieldIds, hint: unknown, error: unknown): string | undefined {
  return [hint ? ids.hint : null, error ? ids.error : null].filter(Boolean).join(' ') || undefined;
}
