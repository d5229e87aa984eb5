import { IdCard, Trash2 } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Card, CardHolder } from '#shared/contracts/cards.js';
import { intlLocale, useDateWords } from '#src/lib/date-words.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';

/** One person and their card, in words. */
export function HolderRow({
  holder,
  busy,
  onMake,
  onEnd,
}: {
  holder: CardHolder;
  busy: boolean;
  /** Null for everybody but the steward. */
  onMake: (() => void) | null;
  onEnd: () => void;
}) {
  const { t } = useTranslation('cards');
  const { displayName: name, card, mayHaveCard } = holder;
  const isLive = card !== null && card.state !== 'ended';
  return (
    <li className="border-t border-hairline py-3 first:border-t-0">
      <p>
        <strong>{name}</strong>
      </p>
      <CardWords holder={holder} />
      <div className="flex flex-wrap gap-x-3">
        {onMake !== null && mayHaveCard && (
          <Button look="quiet" busy={busy} icon={<IdCard aria-hidden size={22} />} onClick={onMake}>
            {isLive ? t('again', { name }) : t('make', { name })}
          </Button>
        )}
        {isLive && (
          <Button look="quiet" busy={busy} icon={<Trash2 aria-hidden size={20} />} onClick={onEnd}>
            {t('end', { name })}
          </Button>
        )}
      </div>
    </li>
  );
}

function CardWords({ holder: { card, mayHaveCard } }: { holder: CardHolder }) {
  const { t, i18n } = useTranslation('cards');
  if (card === null) return <p className="text-umber-soft">{mayHaveCard ? t('noCard') : t('tooWeak')}</p>;
  if (card.endedWhy === 'guessed') {
    return (
      <Care blocked>
        <p>{t('ended.guessed')}</p>
      </Care>
    );
  }
  const time = new Intl.DateTimeFormat(intlLocale(i18n.language), { hour: '2-digit', minute: '2-digit' });
  return (
    <>
      <StateWords card={card} />
      {card.lockedUntil !== null && (
        <Care>
          <p>{t('locked', { time: time.format(new Date(card.lockedUntil)) })}</p>
        </Care>
      )}
    </>
  );
}

function StateWords({ card }: { card: Card }) {
  const { t } = useTranslation('cards');
  const words = useDateWords();
  const day = (instant: string | null) => (instant === null ? '' : words.day(instant.slice(0, 10)));
  const maker = card.madeByName;
  if (card.state === 'ended') {
    return <p className="text-umber-soft">{t(`ended.${card.endedWhy ?? 'revoked'}`)}</p>;
  }
  if (card.state === 'run-out') return <p className="text-umber-soft">{t('runOut')}</p>;
  if (card.state === 'waiting') return <p>{t('waiting', { maker, day: day(card.firstUseUntil) })}</p>;
  return <p>{t('inUse', { maker, day: day(card.lastUsedAt) })}</p>;
}
