import { guards } from '@/shared/rules/published/guards';

import { checkPublished } from '../../../support/published';

checkPublished(guards);
