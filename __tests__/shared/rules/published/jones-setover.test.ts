import { jonesSetover } from '@/shared/rules/published/jones-setover';

import { checkPublished } from '../../../support/published';

checkPublished(jonesSetover);
