import type { SaveState } from './use-autosave';

const clock = (iso: string, timeZone: string) =>
  new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', timeZone }).format(
    new Date(iso),
  );

/** What the header says about the draft. */
export function saveWords(state: SaveState, timeZone: string): string {
  switch (state.kind) {
    case 'saved':
      return `saved ${clock(state.at, timeZone)}`;
    case 'waiting':
      return 'not saved yet';
    case 'saving':
      return 'saving';
    case 'conflict':
      return 'changed elsewhere';
    case 'failed':
      return state.problem.kind === 'refused' ? 'not saved' : 'kept on this device';
  }
}
