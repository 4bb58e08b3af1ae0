import * as yup from 'yup';

import { TEXT_LIMITS } from '@/shared/domain/limits';

/** The yup rule of a name: there, and short enough. */
export const nameRule = (missing: string, longest: number = TEXT_LIMITS.name) =>
  yup.string().trim().required(missing).max(longest, `At most ${longest} characters.`);
