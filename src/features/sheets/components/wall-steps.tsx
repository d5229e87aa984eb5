import { useTranslation } from 'react-i18next';
import type { SheetLayout } from '#shared/contracts/sheets.js';
import { Board } from '#src/ui/surfaces.js';

/** First measure, then print: what to do before the sheet hangs on the wall. */
export function WallSteps({ layout }: { layout: SheetLayout }) {
  const { t } = useTranslation('sheets');
  const steps = [
    t('wall.measure'),
    t('wall.right'),
    t('wall.wrong'),
    ...(layout === 'year-board' ? [t('wall.boardIt')] : []),
    t('wall.hang'),
  ];
  return (
    <Board title={t('wall.title')} className="mt-4">
      <ol className="hole-list">
        {steps.map((step) => (
          <li key={step}>{step}</li>
        ))}
      </ol>
    </Board>
  );
}
