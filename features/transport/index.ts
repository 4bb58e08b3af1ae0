export { newId } from './ids';
export { isRefusal, problemOf, problemWords, type Problem } from './problem';
export { createQueryClient } from './query-client';
export { request, requestNothing } from './request';
export { STALE } from './stale';
export { readStored, removeStored, writeStored } from './device-storage';
export { SESSION_KEY, useEndSession } from './session-end';
