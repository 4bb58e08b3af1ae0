import { Refusal } from '../refusals';
import { loggableError } from './loggable-error';
import { ok, openRoute, type Route } from './route';

interface Health {
  /** Fails when the database does not answer as it should. */
  checkDatabase(): Promise<void>;
  isStopping(): boolean;
}

/** Whether the process lives, and whether it should be sent requests. */
export const healthRoutes = ({ checkDatabase, isStopping }: Health): Route[] => [
  openRoute({ method: 'get', path: '/health', act: () => ok({ status: 'ok' }) }),
  openRoute({
    method: 'get',
    path: '/ready',
    act: async (_input, req) => {
      if (isStopping()) throw new Refusal('unavailable', { detail: 'The server is stopping.' });
      await checkDatabase().catch((error: unknown) => {
        req.log.error({ err: loggableError(error) }, 'not ready');
        throw new Refusal('unavailable', { detail: 'The database does not answer.' });
      });
      return ok({ status: 'ready' });
    },
  }),
];
