import { lazy, Suspense } from 'react';
import type { ColorSheetProps } from './color-sheet';

// Reading typed colours needs a colour library that nobody waits for before a sheet is opened.
const ColorSheet = lazy(async () => ({ default: (await import('./color-sheet')).ColorSheet }));

export const LazyColorSheet = (props: ColorSheetProps) => (
  <Suspense fallback={<p aria-busy="true">Fetching colours …</p>}>
    <ColorSheet {...props} />
  </Suspense>
);
