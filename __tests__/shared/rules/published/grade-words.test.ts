import { gradeWords } from '@/shared/rules/published/grade-words';

import { checkPublished } from '../../../support/published';

checkPublished(gradeWords);
