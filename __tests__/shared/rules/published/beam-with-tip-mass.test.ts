import { beamWithTipMass } from '@/shared/rules/published/beam-with-tip-mass';

import { checkPublished } from '../../../support/published';

checkPublished(beamWithTipMass);
