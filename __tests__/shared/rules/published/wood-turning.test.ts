import { woodTurning } from '@/shared/rules/published/wood-turning';

import { checkPublished } from '../../../support/published';

checkPublished(woodTurning);
