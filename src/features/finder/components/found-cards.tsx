import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { FoundMarker } from '#shared/contracts/finder.js';
import { Button } from '#src/ui/button.js';
import { FoundCard } from './found-card.js';

/** A thumb's worth of cards at a time. */
const STEP = 6;

/** Under 1024 px: a card for each sign, those that need care behind the others. */
export function FoundCards({
  good,
  careful,
}: {
  good: readonly FoundMarker[];
  careful: readonly FoundMarker[];
}) {
  const { t } = useTranslation('finder');
  return (
    <>
      <CardList items={good} title={t('result.good')} isFirst />
      {careful.length > 0 && <CardList items={careful} title={t('result.careful')} />}
    </>
  );
}

function CardList({
  items,
  title,
  isFirst = false,
}: {
  items: readonly FoundMarker[];
  title: string;
  isFirst?: boolean;
}) {
  const { t } = useTranslation('finder');
  const [shown, setShown] = useState(STEP);
  const rest = Math.max(0, items.length - shown);
  if (items.length === 0) return null;
  return (
    <section className="grid gap-4" aria-label={title}>
      <h2>{title}</h2>
      <ul className="grid gap-4 mid:grid-cols-2">
        {items.slice(0, shown).map((found, index) => (
          <li key={`${found.markerKey} ${found.phenomenon} ${String(found.days.expected.dayNumber)}`}>
            <FoundCard found={found} isBest={isFirst && index === 0} />
          </li>
        ))}
      </ul>
      {rest > 0 && (
        <div>
          <Button
            onClick={() => {
              setShown(shown + STEP);
            }}
          >
            {t('result.moreCards', { count: Math.min(STEP, rest) })}
          </Button>
        </div>
      )}
    </section>
  );
}
