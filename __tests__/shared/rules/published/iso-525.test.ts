import { iso525 } from '@/shared/rules/published/iso-525';

import { checkPublished } from '../../../support/published';

checkPublished(iso525);
