import { ansiFlanges } from '@/shared/rules/published/ansi-flanges';

import { checkPublished } from '../../../support/published';

checkPublished(ansiFlanges);
