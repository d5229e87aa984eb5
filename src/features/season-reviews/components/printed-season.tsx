import type { CSSProperties } from 'react';
import { useTranslation } from 'react-i18next';
import type { Decision, Lesson, SeasonReview } from '#shared/contracts/season-reviews.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useSeasonWords, type SeasonWords } from '../model/season-words.js';
import { PAGE, PAGES, pageHeads } from '../model/page-heads.js';
import { COLUMN_SHARES, sheetSize } from '../model/sheet-size.js';

/** Letters of a cell from which its row may go on over the end of a page. */
const LONG_CELL = 1200;

/** The year as a table for the wall of the meeting: on one page of A4, or on numbered ones. On the screen it is not there. */
export function PrintedSeason({ review }: { review: SeasonReview }) {
  const { t } = useTranslation('season');
  const dates = useDateWords();
  const words = useSeasonWords();
  const said = useSaidWords(words);
  const { year, entries, notices, lessons, decisions, villageLanguageTag } = review;
  const rows = entries.map((entry) => ({
    entry,
    cells: [
      words.planned(entry, review),
      words.done(entry) ?? t('sheet.notYet'),
      [words.star(entry), ...words.signs(entry)].filter((each) => each !== null).join(' '),
      said(entry.lessons, entry.decisions),
    ],
  }));
  const wide = [
    ...notices.map(({ issuer, issuedOn, expiresOn, text }) =>
      t('notices.line', { issuer, from: dates.day(issuedOn), to: dates.day(expiresOn), text }),
    ),
    ...(lessons.length + decisions.length === 0 ? [] : [said(lessons, decisions)]),
  ];
  const { letterPt } = sheetSize(
    rows.map(({ entry: { titleOfficer, titleVillage }, cells }) => [
      titleOfficer.length + titleVillage.length + 1,
      ...cells.map(({ length }) => length),
    ]),
    wide.map(({ length }) => length),
  );
  const under = words.under(review);
  const heads = {
    running: t('sheet.running', { title: t('title', { year }), under }),
    number: t('sheet.page', { page: PAGE, pages: PAGES }),
  };
  return (
    <section className="season-sheet" style={{ '--season-letters': `${letterPt}pt` } as CSSProperties}>
      <style>{pageHeads(heads)}</style>
      <h1>{t('title', { year })}</h1>
      <p>{under}</p>
      {wide.map((line) => (
        <p key={line}>{line}</p>
      ))}
      <table>
        <caption className="for-ears">{t('sheet.caption')}</caption>
        <colgroup>
          {COLUMN_SHARES.map((share) => (
            <col key={share} style={{ inlineSize: `${share * 100}%` }} />
          ))}
        </colgroup>
        <thead>
          <tr>
            {(['entry', 'planned', 'done', 'signs', 'lessons'] as const).map((column) => (
              <th key={column} scope="col">
                {t(`sheet.${column}`)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ entry, cells }) => (
            <tr key={entry.entryId} data-long={cells.some(({ length }) => length > LONG_CELL) || undefined}>
              <th scope="row">
                {entry.titleOfficer}{' '}
                <span className="own-words" lang={villageLanguageTag}>
                  {entry.titleVillage}
                </span>
              </th>
              {cells.map((cell, column) => (
                <td key={COLUMN_SHARES[column]}>{cell}</td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      <p>{t('sheet.legend', { year: year + 1 })}</p>
    </section>
  );
}

/** Lessons and decisions one after the other, as a cell of the sheet holds them. */
function useSaidWords(words: SeasonWords) {
  const { t } = useTranslation('season');
  return (lessons: readonly Lesson[], decisions: readonly Decision[]) =>
    [
      ...lessons.map(({ text, by }) => `${text} (${by})`),
      ...decisions.map((decision) =>
        t(decision.done === null ? 'sheet.decided' : 'sheet.decidedDone', { task: words.decision(decision) }),
      ),
    ].join(' ');
}
