import { firstPrinciplesDressing } from '@/shared/rules/published/first-principles-dressing';

import { checkPublished } from '../../../support/published';

checkPublished(firstPrinciplesDressing);
