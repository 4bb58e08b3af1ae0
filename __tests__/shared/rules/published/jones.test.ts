import { jones } from '@/shared/rules/published/jones';

import { checkPublished } from '../../../support/published';

checkPublished(jones);
