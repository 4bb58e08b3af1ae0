import { machinerysHandbookDiamonds } from '@/shared/rules/published/machinerys-handbook-diamonds';

import { checkPublished } from '../../../support/published';

checkPublished(machinerysHandbookDiamonds);
