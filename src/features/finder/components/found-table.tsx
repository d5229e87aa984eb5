import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { FoundMarker } from '#shared/contracts/finder.js';
import { paths } from '#src/lib/paths.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { PhenomenonIcon } from '#src/ui/icons/phenomenon-icon.js';
import { Table } from '#src/ui/table.js';
import { Link } from 'react-router-dom';
import { useFinderFacts } from './finder-context.js';

/** Rows before the person asks for the rest. */
const STEP = 20;

/** From 1024 px: three columns that decide, four more on demand. */
export function FoundTable({ items }: { items: readonly FoundMarker[] }) {
  const { t } = useTranslation('finder');
  const { words, wanted, answer, takePath } = useFinderFacts();
  const [isFull, setIsFull] = useState(false);
  const [shown, setShown] = useState(STEP);
  const rest = Math.max(0, items.length - shown);
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-3">
      <div>
        <Button
          aria-expanded={isFull}
          onClick={() => {
            setIsFull(!isFull);
          }}
        >
          {t(isFull ? 'fewerColumns' : 'moreColumns')}
        </Button>
      </div>
      <Table
        caption={t('result.caption', { days: words.wanted(wanted) })}
        middle
        className={isFull ? 'min-w-[80rem]' : undefined}
      >
        <thead>
          <tr>
            <th scope="col">{t('column.sign')}</th>
            <th scope="col">{t('column.day')}</th>
            <th scope="col">{t('column.near')}</th>
            <th scope="col">{t('column.exact')}</th>
            <th scope="col">{t('column.ease')}</th>
            {isFull && (
              <>
                <th scope="col">{t('column.keeps')}</th>
                <th scope="col">{t('column.moon', { year: answer.year })}</th>
                <th scope="col">{t('column.air')}</th>
                <th scope="col">{t('column.where')}</th>
              </>
            )}
            {takePath !== null && (
              <th scope="col">
                <span className="for-ears">{t('column.act')}</span>
              </th>
            )}
          </tr>
        </thead>
        <tbody>
          {items.slice(0, shown).map((found, index) => (
            <FoundRow
              key={`${found.markerKey} ${found.phenomenon} ${String(found.days.expected.dayNumber)}`}
              found={found}
              isFull={isFull}
              isBest={index === 0 && found.caution === null}
            />
          ))}
        </tbody>
      </Table>
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
    </div>
  );
}

function FoundRow({ found, isFull, isBest }: { found: FoundMarker; isFull: boolean; isBest: boolean }) {
  const { t } = useTranslation(['finder', 'sky']);
  const { words, takePath, isForEntry, answer, placeId } = useFinderFacts();
  const star = words.name(found);
  return (
    <tr>
      <th scope="row">
        <span className="flex items-center gap-3">
          <PhenomenonIcon phenomenon={found.phenomenon} size={28} />
          <span>
            <Link
              className="text-umber"
              to={paths.star(found.markerKey, { placeId, year: answer.year })}
              aria-label={t('aboutStarOf', { star })}
            >
              {star}
            </Link>
            <span className="range-line">{words.phenomenon(found)}</span>
          </span>
        </span>
      </th>
      <td>
        {words.day(found)}
        <span className="range-line">{words.range(found.days)}</span>
      </td>
      <td>{words.near(found)}</td>
      <td>
        {words.exact(found)}
        {found.caution !== null && <span className="range-line">{t(`caution.${found.caution}`)}</span>}
      </td>
      <td>{words.ease(found)}</td>
      {isFull && (
        <>
          <td>{words.keeps(found)}</td>
          <td>{words.moon(found)}</td>
          <td>
            {words.air(found)}
            {words.rain(found) !== null && <span className="range-line">{words.rain(found)}</span>}
          </td>
          <td>{words.where(found)}</td>
        </>
      )}
      {takePath !== null && (
        <td>
          <ButtonLink
            className="whitespace-nowrap"
            look={isBest ? 'main' : 'quiet'}
            to={takePath(found)}
            aria-label={t(isForEntry ? 'takeOf' : 'tieOf', {
              star,
              phenomenon: t(`sky:phenomenon.${found.phenomenon}`),
            })}
          >
            {t(isForEntry ? 'take' : 'tie')}
          </ButtonLink>
        </td>
      )}
    </tr>
  );
}
