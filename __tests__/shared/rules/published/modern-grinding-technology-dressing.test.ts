import { modernGrindingDressing } from '@/shared/rules/published/modern-grinding-technology-dressing';

import { checkPublished } from '../../../support/published';

checkPublished(modernGrindingDressing);
