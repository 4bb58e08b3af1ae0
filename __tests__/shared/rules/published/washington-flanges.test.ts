import { washingtonFlanges } from '@/shared/rules/published/washington-flanges';

import { checkPublished } from '../../../support/published';

checkPublished(washingtonFlanges);
