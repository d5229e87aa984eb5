import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Comparison, Version, VersionSummary } from '#shared/contracts/versions.js';
import { paths } from '#src/lib/paths.js';
import { WhyMovedLines } from '#src/lib/why-moved-lines.js';
import { Board } from '#src/ui/surfaces.js';
import { comparisonQuery } from '../api/comparison-query.js';
import { differing } from '../model/entry-change.js';
import { entrySentences } from '../model/entry-sentences.js';
import { SentenceLine } from './sentence-line.js';
import { useCompareNames } from './use-compare-names.js';
import { useCompareWords } from './use-compare-words.js';

/** What a mended version of the same year says otherwise than the one that it took the place of. */
export function ChangesBoard({ version, before }: { version: Version; before: VersionSummary }) {
  const { t } = useTranslation('versions');
  const { calendarId, number } = version;
  const { data } = useQuery(comparisonQuery(calendarId, String(before.number), String(number)));
  if (data === undefined) return null;
  return (
    <Board title={t('changes.title', { label: before.label ?? '' })}>
      <ChangeList calendarId={calendarId} comparison={data} />
      <p className="mt-2">
        <Link className="link-line" to={paths.compare(calendarId, { from: before.number, to: number })}>
          {t('changes.more')}
        </Link>
      </p>
    </Board>
  );
}

function ChangeList({ calendarId, comparison }: { calendarId: string; comparison: Comparison }) {
  const { t } = useTranslation('versions');
  const words = useCompareWords(comparison.year, useCompareNames(calendarId, comparison));
  const changed = differing(comparison.entries);
  if (changed.length === 0) return <p>{t('changes.none')}</p>;
  return (
    <ul className="grid gap-2">
      {changed.map((entry) => (
        <li key={entry.entryId}>
          <strong>{entry.titleOfficer}</strong>
          {entrySentences(entry, comparison.year, words).map((sentence) => (
            <p key={sentence.key}>
              <SentenceLine sentence={sentence} />
            </p>
          ))}
          {entry.why && (
            <div className="text-small text-umber-soft">
              <WhyMovedLines why={entry.why} />
            </div>
          )}
        </li>
      ))}
    </ul>
  );
}
