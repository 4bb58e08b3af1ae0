import { machinerysHandbookMarks } from '@/shared/rules/published/machinerys-handbook-marks';

import { checkPublished } from '../../../support/published';

checkPublished(machinerysHandbookMarks);
