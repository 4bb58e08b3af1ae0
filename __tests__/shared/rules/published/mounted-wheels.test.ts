import { mountedWheels } from '@/shared/rules/published/mounted-wheels';

import { checkPublished } from '../../../support/published';

checkPublished(mountedWheels);
