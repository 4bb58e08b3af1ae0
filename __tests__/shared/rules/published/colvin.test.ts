import { colvin } from '@/shared/rules/published/colvin';

import { checkPublished } from '../../../support/published';

checkPublished(colvin);
