import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { FinderAnswer } from '#shared/contracts/finder.js';
import type { Place } from '#shared/contracts/places.js';
import { useWideScreen } from '#src/lib/wide-screen.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { FinderContext, type FinderFacts } from './finder-context.js';
import { FoundCards } from './found-cards.js';
import { FoundTable } from './found-table.js';
import { NoMarker } from './no-marker.js';
import { OldMarkerBoard } from './old-marker-board.js';
import { SkySignsFold } from './sky-signs.js';
import { useFoundWords } from './use-found-words.js';
import { YearsBoard } from './years-board.js';

interface FinderAnswerViewProps {
  answer: FinderAnswer;
  place: Place;
  takePath: FinderFacts['takePath'];
  isForEntry: boolean;
  /** True where faint stars were looked through too. */
  isAll: boolean;
  onShowAll: () => void;
}

/** What was found: the old sign's way, the signs in their order, what to do where there are none. */
export function FinderAnswerView(props: FinderAnswerViewProps) {
  const { answer, place, takePath, isForEntry, isAll, onShowAll } = props;
  const { t } = useTranslation('finder');
  const isWide = useWideScreen();
  const { wanted, old } = answer;
  const words = useFoundWords(wanted !== null && wanted.to.dayNumber > wanted.from.dayNumber);
  const facts = useMemo(
    () => wanted && { answer, wanted, placeId: place.id, words, takePath, isForEntry },
    [answer, wanted, place.id, words, takePath, isForEntry],
  );
  const good = answer.items.filter(({ caution }) => caution === null);
  const careful = answer.items.filter(({ caution }) => caution !== null);
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
      {old !== null && <OldMarkerBoard old={old} wanted={wanted} />}
      {facts !== null && (
        <FinderContext value={facts}>
          <div>
            <p role="status">
              {t('result.found', {
                count: answer.total,
                days: words.wanted(facts.wanted),
                searched: answer.searched,
              })}{' '}
              {answer.items.length < answer.total && t('result.listed', { count: answer.items.length })}
            </p>
            {good.length > 0 && (
              <p className="text-small text-umber-soft">
                {t('result.order')} {!isWide && t('pictureKey')}
              </p>
            )}
          </div>
          {good.length === 0 && <NoMarker isAll={isAll} onShowAll={onShowAll} />}
          {isWide ? (
            answer.items.length > 0 && <FoundTable items={[...good, ...careful]} />
          ) : (
            <FoundCards good={good} careful={careful} />
          )}
          {good.length > 0 && <SkySignsFold />}
          {good.length > 0 && <YearsBoard items={good} />}
          <Care>
            <p>{t('notWeather')}</p>
          </Care>
        </FinderContext>
      )}
      {facts === null && old !== null && (
        <Board>
          <p>{t('old.ask')}</p>
        </Board>
      )}
    </div>
  );
}
