import { ringTest } from '@/shared/rules/published/ring-test';

import { checkPublished } from '../../../support/published';

checkPublished(ringTest);
