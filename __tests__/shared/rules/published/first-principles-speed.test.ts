import { firstPrinciplesSpeed } from '@/shared/rules/published/first-principles-speed';

import { checkPublished } from '../../../support/published';

checkPublished(firstPrinciplesSpeed);
