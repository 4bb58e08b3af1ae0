import { lautard } from '@/shared/rules/published/lautard';

import { checkPublished } from '../../../support/published';

checkPublished(lautard);
