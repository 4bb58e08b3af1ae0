import { groover } from '@/shared/rules/published/groover';

import { checkPublished } from '../../../support/published';

checkPublished(groover);
