import { navy14345 } from '@/shared/rules/published/navy-14345';

import { checkPublished } from '../../../support/published';

checkPublished(navy14345);
