import { marinescu } from '@/shared/rules/published/marinescu';

import { checkPublished } from '../../../support/published';

checkPublished(marinescu);
