import { grooverProblems } from '@/shared/rules/published/groover-problems';

import { checkPublished } from '../../../support/published';

checkPublished(grooverProblems);
