import { FigurePage } from '#src/features/figures/components/figure-page.js';
import { MarkerDays } from '#src/features/stars/components/marker-days.js';

/** A figure with its four days. */
export function Component() {
  return <FigurePage days={(markerKey) => <MarkerDays key={markerKey} markerKey={markerKey} />} />;
}
