import { nptelRotorDynamics } from '@/shared/rules/published/nptel-rotor-dynamics';

import { checkPublished } from '../../../support/published';

checkPublished(nptelRotorDynamics);
