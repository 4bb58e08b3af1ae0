import type { ComponentType } from 'react';

import { NotFoundScreen } from '@/features/ui/not-found-screen';

let Screen: ComponentType = NotFoundScreen;
// Metro drops the branch not taken, and with it the catalogue, from what ships; an import would not.
if (__DEV__) {
  // eslint-disable-next-line @typescript-eslint/no-require-imports
  const { CatalogueScreen } = require('@/features/ui/catalogue-screen');
  Screen = CatalogueScreen;
}

export default Screen;
