import { trialRun } from '@/shared/rules/published/trial-run';

import { checkPublished } from '../../../support/published';

checkPublished(trialRun);
