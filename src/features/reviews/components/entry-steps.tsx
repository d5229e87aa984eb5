import { ArrowLeft, ArrowRight } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Button } from '#src/ui/button.js';

interface EntryStepsProps {
  index: number;
  total: number;
  goTo: (index: number) => void;
}

/** From one entry of a review to the one before and the next; behind the last one stands the end. */
export function EntrySteps({ index, total, goTo }: EntryStepsProps) {
  const { t } = useTranslation('reviews');
  return (
    <div className="flex flex-wrap justify-between gap-2">
      <Button
        look="quiet"
        icon={<ArrowLeft aria-hidden size={20} className="turns" />}
        closedBecause={index === 0 ? t('entryOf', { entry: 1, total }) : undefined}
        onClick={() => {
          goTo(index - 1);
        }}
      >
        {t('before')}
      </Button>
      <Button
        look="quiet"
        icon={<ArrowRight aria-hidden size={20} className="turns" />}
        onClick={() => {
          goTo(index + 1);
        }}
      >
        {index + 1 < total ? t('next') : t('toEnd')}
      </Button>
    </div>
  );
}
