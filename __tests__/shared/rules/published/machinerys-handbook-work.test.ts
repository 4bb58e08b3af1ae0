import {
  machinerysHandbookWork,
  recalledMaterials,
} from '@/shared/rules/published/machinerys-handbook-work';
import { workRow } from '@/shared/rules/work-table';

import { checkPublished } from '../../../support/published';

checkPublished(machinerysHandbookWork);
checkPublished(recalledMaterials);

it('treats cast iron and stainless as plain carbon steel, annealed, and says that this is recalled', () => {
  for (const material of ['cast-iron', 'stainless'] as const) {
    expect(workRow(material)).toEqual({
      ...workRow('plain-carbon-annealed'),
      source: 'memory-materials',
    });
  }
});
