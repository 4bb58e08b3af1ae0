import { commonPracticeOverrun } from '@/shared/rules/published/common-practice-overrun';

import { checkPublished } from '../../../support/published';

checkPublished(commonPracticeOverrun);
