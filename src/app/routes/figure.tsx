import { useNavigate } from 'react-router-dom';
import { AboutItem } from '#src/app/items/about-item.js';
import { textsOfFigure } from '#src/app/items/noted-texts.js';
import { FigurePage } from '#src/features/figures/components/figure-page.js';
import { MarkerDays } from '#src/features/stars/components/marker-days.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';

/** A figure with its four days, its voices and pictures, and who may see it. */
export function Component() {
  const { communityId } = useCurrentCommunity();
  const navigate = useNavigate();
  return (
    <FigurePage
      days={(markerKey) => <MarkerDays key={markerKey} markerKey={markerKey} />}
      about={(figure) => (
        <AboutItem
          item={{ communityId, itemType: 'figure', itemId: figure.id }}
          texts={textsOfFigure(figure)}
          onHidden={() => void navigate(paths.villageFigures())}
        />
      )}
    />
  );
}
