import { nistUnits } from '@/shared/rules/published/nist-units';

import { checkPublished } from '../../../support/published';

checkPublished(nistUnits);
