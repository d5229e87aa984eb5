import { Link as LinkIcon } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { FoundMarker } from '#shared/contracts/finder.js';
import { paths } from '#src/lib/paths.js';
import { ButtonLink } from '#src/ui/button.js';
import { More } from '#src/ui/fold.js';
import { PhenomenonIcon } from '#src/ui/icons/phenomenon-icon.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { useFinderFacts } from './finder-context.js';
import { NearPicture } from './near-picture.js';

/** One sign: its day with its range, the wanted days beside it, and the three things that decide. */
export function FoundCard({ found, isBest }: { found: FoundMarker; isBest: boolean }) {
  const { t } = useTranslation(['finder', 'sky']);
  const { words, takePath, isForEntry, answer, placeId } = useFinderFacts();
  const star = words.name(found);
  const phenomenon = t(`sky:phenomenon.${found.phenomenon}`);
  return (
    <Board
      level={3}
      className="flex h-full flex-col"
      title={
        <span className="flex items-center gap-3">
          <PhenomenonIcon phenomenon={found.phenomenon} size={32} />
          <span>
            {star}
            <span className="range-line">{words.phenomenon(found)}</span>
          </span>
        </span>
      }
    >
      <p className="text-part leading-tight">{words.day(found)}</p>
      <p className="mb-2">{words.range(found.days)}</p>
      <NearPicture found={found} />
      <ul className="mt-2">
        <li>{words.nearInFull(found)}</li>
        <li>{words.exact(found)}</li>
        <li>{words.ease(found)}</li>
        {words.rain(found) !== null && <li>{words.rain(found)}</li>}
      </ul>
      {found.caution !== null && (
        <Care className="mt-3">
          <p>{t(`caution.${found.caution}`)}</p>
        </Care>
      )}
      <More label={t('more')}>
        <dl className="facts">
          <Fact name={t('column.keeps')}>{words.keeps(found)}</Fact>
          <Fact name={t('column.moon', { year: answer.year })}>{words.moon(found)}</Fact>
          <Fact name={t('column.air')}>{words.air(found)}</Fact>
          <Fact name={t('column.where')}>{words.where(found)}</Fact>
        </dl>
        <p className="mt-2 text-small text-umber-soft">{t(`sky:trade.${found.phenomenon}`)}</p>
        <ButtonLink
          look="quiet"
          className="-ms-2"
          to={paths.star(found.markerKey, { placeId, year: answer.year })}
          aria-label={t('aboutStarOf', { star })}
        >
          {t('aboutStar')}
        </ButtonLink>
        <ButtonLink
          look="quiet"
          className="-ms-2"
          to={paths.drift(found.markerKey, { placeId, year: answer.year })}
          aria-label={t('driftOf', { star })}
        >
          {t('drift')}
        </ButtonLink>
      </More>
      {takePath !== null && (
        <div className="mt-auto pt-2">
          <ButtonLink
            look={isBest ? 'main' : 'plain'}
            full={isBest}
            to={takePath(found)}
            icon={<LinkIcon aria-hidden size={20} />}
            aria-label={t(isForEntry ? 'takeOf' : 'tieOf', { star, phenomenon })}
          >
            {t(isForEntry ? 'take' : 'tie')}
          </ButtonLink>
        </div>
      )}
    </Board>
  );
}

function Fact({ name, children }: { name: string; children: React.ReactNode }) {
  return (
    <div className="contents">
      <dt>{name}</dt>
      <dd>{children}</dd>
    </div>
  );
}
