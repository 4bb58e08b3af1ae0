import { useCallback, useEffect, useRef, useState } from 'react';

import { isRefusal, problemOf, type Problem } from '@/features/transport';
import { setup as setupContract, type Setup } from '@/shared/contracts/setups';

import { toRequest, type SetupValues } from './form';
import { useSaveSetup } from './queries';

export type SaveState =
  | { kind: 'saved'; at: string }
  | { kind: 'waiting' }
  | { kind: 'saving' }
  | { kind: 'failed'; problem: Problem }
  | { kind: 'conflict'; theirs: Setup };

const PAUSE_MS = 700;
const RETRY_MS = 5_000;

interface AutosaveOptions {
  shopId: string;
  setupId: string;
  values: SetupValues;
  /** The version that the values stand on at first; null for a setup that the server has not seen. */
  version: number | null;
  /** When the server last stored it, ISO. */
  savedAt: string | null;
  /** True when the first values hold more than the server has. */
  unsent: boolean;
  /** The server's newer version, when the first values stand on an older one. */
  theirs: Setup | null;
  /** False while the values cannot be stored: a name is missing. */
  valid: boolean;
}

function firstState({ theirs, unsent, savedAt }: AutosaveOptions): SaveState {
  if (theirs) return { kind: 'conflict', theirs };
  return unsent || savedAt === null ? { kind: 'waiting' } : { kind: 'saved', at: savedAt };
}

/**
 * Sends a draft to the server whenever typing pauses, one request at a time, and again while the server cannot be
 * reached. A conflict stops it until the person has chosen.
 */
export function useAutosave(options: AutosaveOptions) {
  const { shopId, setupId, values, valid } = options;
  const { mutateAsync } = useSaveSetup(shopId);
  const [state, setState] = useState(() => firstState(options));
  const [version, setVersion] = useState(options.version);
  /** The values that the server holds; Formik makes new objects at each change. */
  const [stored, setStored] = useState(options.unsent ? null : values);
  const unsent = valid && !isStored(stored, values);
  const inFlight = useRef(false);

  const send = useCallback(async () => {
    if (inFlight.current) return;
    inFlight.current = true;
    setState({ kind: 'saving' });
    try {
      const body = toRequest(values);
      const saved = await mutateAsync({
        id: setupId,
        body: version === null ? { id: setupId, ...body } : { version, ...body },
      });
      setStored(values);
      setVersion(saved.version);
      setState({ kind: 'saved', at: saved.updatedAt });
    } catch (error) {
      const theirs = currentOf(error);
      setState(
        theirs ? { kind: 'conflict', theirs } : { kind: 'failed', problem: problemOf(error) },
      );
    } finally {
      inFlight.current = false;
    }
  }, [mutateAsync, setupId, values, version]);

  useEffect(() => {
    if (!unsent || state.kind === 'conflict' || state.kind === 'saving') return;
    const timer = setTimeout(() => void send(), state.kind === 'failed' ? RETRY_MS : PAUSE_MS);
    return () => clearTimeout(timer);
  }, [unsent, state.kind, send]);

  /** After a conflict: the person's values go on top of the server's version. */
  const keepMine = useCallback((theirs: Setup) => {
    setVersion(theirs.version);
    setState({ kind: 'waiting' });
  }, []);

  /** After a conflict: the server's values replace the person's. */
  const take = useCallback((theirs: Setup, taken: SetupValues) => {
    setStored(taken);
    setVersion(theirs.version);
    setState({ kind: 'saved', at: theirs.updatedAt });
  }, []);

  const shown: SaveState = unsent && state.kind === 'saved' ? { kind: 'waiting' } : state;
  return { state: shown, version, saveNow: send, keepMine, take };
}

/** Shown in other units, the same inputs need no saving. */
function isStored(stored: SetupValues | null, values: SetupValues): boolean {
  if (stored === null || stored.name !== values.name || stored.inputs !== values.inputs)
    return false;
  return stored.texts === values.texts || stored.units !== values.units;
}

function currentOf(error: unknown): Setup | null {
  if (!isRefusal(error, 'stale-version')) return null;
  const problem = problemOf(error);
  if (problem.kind !== 'refused') return null;
  const parsed = setupContract.safeParse(problem.details.current);
  return parsed.success ? parsed.data : null;
}
