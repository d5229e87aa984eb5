import { useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { FoundMarker } from '#shared/contracts/finder.js';
import { useDateWords } from '#src/lib/date-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { ProgressPegs } from '#src/ui/pegs.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { Table } from '#src/ui/table.js';
import { useYears, type YearsWork } from '../model/use-years.js';
import { yearsHeld } from '../model/years-held.js';
import { useFinderFacts } from './finder-context.js';

const CHOICES = ['10', '20', '40'] as const;
/** Signs that are worth a look over the years. */
const FIRST_SIGNS = 8;

/** Which of the first signs keeps near the wanted days in the coming years. */
export function YearsBoard({ items }: { items: readonly FoundMarker[] }) {
  const { t } = useTranslation(['finder', 'common']);
  const problems = useProblemWords();
  const { answer, placeId } = useFinderFacts();
  const [count, setCount] = useState<(typeof CHOICES)[number]>('10');
  const first = items.slice(0, FIRST_SIGNS);
  const asked = first.map(({ markerKey, phenomenon }) => `${markerKey} ${phenomenon}`).join(',');
  // Another question throws the old answer away.
  const { work, start, stop } = useYears(placeId);
  const [answeredFor, setAnsweredFor] = useState('');
  const isFor = `${String(answer.year)} ${asked}`;
  const shown = answeredFor === isFor ? work : null;
  const isRunning = shown?.state === 'running';
  return (
    <Board title={t('years.title')}>
      <p>{t('years.hint')}</p>
      <div className="mt-3 flex flex-wrap items-end gap-3">
        <PickGroup
          label={t('years.howMany')}
          labelForEars
          value={count}
          onChange={setCount}
          options={CHOICES.map((value) => ({ value, label: t('years.years', { count: Number(value) }) }))}
        />
        <Button
          busy={isRunning}
          onClick={() => {
            setAnsweredFor(isFor);
            start(
              Array.from({ length: Number(count) }, (_, index) => answer.year + index),
              first.map(({ markerKey, phenomenon }) => ({ markerKey, phenomenon })),
            );
          }}
        >
          {t('years.start')}
        </Button>
      </div>
      {isRunning && (
        <div className="long-work mt-3" role="status">
          <ProgressPegs
            total={shown.total}
            current={shown.done}
            isDone={(index) => index < shown.done}
            label={t('years.progress', { done: shown.done, total: shown.total })}
          />
          <Button onClick={stop}>{t('common:stop')}</Button>
        </div>
      )}
      {shown?.state === 'stopped' && <p role="status">{t('years.stopped', { count: shown.done })}</p>}
      {shown?.problem && (
        <p role="alert">
          {t('years.trouble')}: {problems.problem(shown.problem)}
        </p>
      )}
      {shown !== null && shown.items.length > 0 && <HeldTable items={first} work={shown} />}
    </Board>
  );
}

function HeldTable({ items, work }: { items: readonly FoundMarker[]; work: YearsWork }) {
  const { t } = useTranslation(['finder', 'sky']);
  const dates = useDateWords();
  const { answer, wanted } = useFinderFacts();
  const held = useMemo(
    () =>
      yearsHeld(work.items, answer.year, { from: wanted.from.dayNumber, to: wanted.to.dayNumber }).sort(
        (a, b) => b.held - a.held,
      ),
    [work.items, answer.year, wanted],
  );
  const nameOf = (markerKey: string) => {
    const names = items.find((item) => item.markerKey === markerKey);
    return names ? markerName(names) : markerKey;
  };
  return (
    <Table
      className="mt-3"
      captionForEars={false}
      caption={t('years.caption', { from: answer.year, to: answer.year + work.done - 1 })}
    >
      <thead>
        <tr>
          <th scope="col">{t('years.sign')}</th>
          <th scope="col">{t('years.held')}</th>
          <th scope="col">{t('years.earliest')}</th>
          <th scope="col">{t('years.latest')}</th>
        </tr>
      </thead>
      <tbody>
        {held.map((row) => (
          <tr key={`${row.markerKey} ${row.phenomenon}`}>
            <th scope="row">
              {nameOf(row.markerKey)}
              <span className="range-line">{t(`sky:phenomenonTitle.${row.phenomenon}`)}</span>
            </th>
            <td>{t('years.heldIn', { held: row.held, total: row.years })}</td>
            {row.earliest === null || row.latest === null ? (
              <td colSpan={2}>{t('years.noDay')}</td>
            ) : (
              <>
                <td>{dates.day(row.earliest)}</td>
                <td>{dates.day(row.latest)}</td>
              </>
            )}
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
