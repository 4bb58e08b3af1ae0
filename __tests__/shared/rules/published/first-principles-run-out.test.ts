import { firstPrinciplesRunOut } from '@/shared/rules/published/first-principles-run-out';

import { checkPublished } from '../../../support/published';

checkPublished(firstPrinciplesRunOut);
