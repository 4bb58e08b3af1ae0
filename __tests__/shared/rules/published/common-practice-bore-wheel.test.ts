import { commonPracticeBoreWheel } from '@/shared/rules/published/common-practice-bore-wheel';

import { checkPublished } from '../../../support/published';

checkPublished(commonPracticeBoreWheel);
