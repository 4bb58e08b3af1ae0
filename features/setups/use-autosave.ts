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
  /** The version that the values stand on; null for a setup that the server has not seen. */
  version: number | null;
  /** When the server last stored it, ISO. */
  savedAt: string | null;
  /** False while the name is missing. */
  valid: boolean;
  onSaved: (saved: Setup, values: SetupValues) => void;
}

/**
 * Sends a draft to the server whenever typing pauses, one request at a time, and again while the server cannot be
 * reached. Stops at a conflict until the person has chosen.
 */
export function useAutosave(options: AutosaveOptions) {
  const { values, valid, savedAt } = options;
  const save = useSaveSetup(options.shopId);
  const version = useRef(options.version);
  const stored = useRef(options.version === null ? null : options.values);
  const latest = useRef(options);
  latest.current = options;
  const inFlight = useRef(false);
  const [state, setState] = useState<SaveState>(
    savedAt ? { kind: 'saved', at: savedAt } : { kind: 'waiting' },
  );

  const send = useCallback(async () => {
    const { setupId, values: sent, onSaved } = latest.current;
    if (inFlight.current || stored.current === sent) return;
    inFlight.current = true;
    setState({ kind: 'saving' });
    try {
      const body = toRequest(sent);
      const saved = await save.mutateAsync({
        id: setupId,
        body: version.current === null ? { id: setupId, ...body } : { version: version.current, ...body },
      });
      version.current = saved.version;
      stored.current = sent;
      onSaved(saved, sent);
      setState(
        latest.current.values === sent ? { kind: 'saved', at: saved.updatedAt } : { kind: 'waiting' },
      );
    } catch (error) {
      const theirs = currentOf(error);
      setState(theirs ? { kind: 'conflict', theirs } : { kind: 'failed', problem: problemOf(error) });
    } finally {
      inFlight.current = false;
    }
  }, [save]);

  useEffect(() => {
    if (stored.current === values || !valid || state.kind === 'conflict' || state.kind === 'saving')
      return;
    const pause = state.kind === 'failed' ? RETRY_MS : PAUSE_MS;
    const timer = setTimeout(() => void send(), pause);
    return () => clearTimeout(timer);
  }, [values, valid, state, send]);

  /** After a conflict: go on from the server's version, with the person's own values or with theirs. */
  const resolve = useCallback((theirs: Setup, keep: SetupValues | null) => {
    version.current = theirs.version;
    if (keep === null) stored.current = latest.current.values;
    setState(keep === null ? { kind: 'saved', at: theirs.updatedAt } : { kind: 'waiting' });
  }, []);

  return { state, saveNow: send, resolve };
}

function currentOf(error: unknown): Setup | null {
  if (!isRefusal(error, 'stale-version')) return null;
  const problem = problemOf(error);
  const parsed =
    problem.kind === 'refused' ? setupContract.safeParse(problem.details.current) : undefined;
  return parsed?.success ? parsed.data : null;
}
