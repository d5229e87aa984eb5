import { useTranslation } from 'react-i18next';
import type { Comparison } from '#shared/contracts/versions.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { Columns } from '#src/ui/page.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { aboutTopic, CHANGE_TOPICS, type ChangeTopic } from '../model/change-topics.js';
import { differing } from '../model/entry-change.js';
import { headerSentences } from '../model/header-sentences.js';
import { CompareEntry } from './compare-entry.js';
import { CompareTable } from './compare-table.js';
import { SentenceLine } from './sentence-line.js';
import { useCompareNames } from './use-compare-names.js';
import { useCompareReasons } from './use-compare-reasons.js';
import { useCompareWords } from './use-compare-words.js';

export type Show = 'changed' | 'all' | 'table';

interface CompareResultProps {
  calendarId: string;
  comparison: Comparison;
  seesDrafts: boolean;
  show: Show;
  onShow: (show: Show) => void;
  topic: ChangeTopic | null;
  onTopic: (topic: ChangeTopic | null) => void;
}

/** First how many, then one sentence an entry, then the reason and who. */
export function CompareResult(props: CompareResultProps) {
  const { calendarId, comparison, seesDrafts, show, onShow, topic, onTopic } = props;
  const { t } = useTranslation('versions');
  const { entries, year, header } = comparison;
  const words = useCompareWords(year, useCompareNames(calendarId, comparison));
  const reasons = useCompareReasons(calendarId, comparison, seesDrafts);
  const changed = aboutTopic(differing(entries), topic);
  const shown = show === 'all' ? aboutTopic(entries, topic) : changed;
  const same = entries.filter(({ change }) => change === 'same');
  const basis = headerSentences(header);
  return (
    <>
      <CountSentences comparison={comparison} />
      <PickGroup
        className="compare-show mb-3"
        label={t('compare.show')}
        labelForEars
        value={show}
        onChange={onShow}
        options={[
          { value: 'changed', label: t('compare.onlyChanged') },
          { value: 'all', label: t('compare.all', { count: entries.length }) },
          { value: 'table', label: t('compare.asTable') },
        ]}
      />
      <PickGroup
        className="compare-show mb-4"
        label={t('topic.label')}
        value={topic ?? 'all'}
        onChange={(next) => {
          onTopic(next === 'all' ? null : next);
        }}
        options={(['all', ...CHANGE_TOPICS] as const).map((value) => ({ value, label: t(`topic.${value}`) }))}
      />
      {topic !== null && <p className="mb-3">{t(`topic.only.${topic}`, { count: shown.length })}</p>}
      <Columns wider="first">
        <div className="grid gap-4">
          {show === 'table' ? (
            <CompareTable entries={entries} words={words} topic={topic} />
          ) : (
            shown.map((entry) => (
              <CompareEntry
                key={entry.entryId}
                entry={entry}
                comparison={comparison}
                words={words}
                reasons={reasons}
                topic={topic}
              />
            ))
          )}
        </div>
        <div className="grid gap-4">
          {basis.length > 0 && (topic === null || topic === 'dates') && (
            <Board title={t('compare.basisTitle')}>
              <ul className="grid gap-2">
                {basis.map((sentence) => (
                  <li key={sentence.key}>
                    <SentenceLine sentence={sentence} />
                  </li>
                ))}
              </ul>
            </Board>
          )}
          {show === 'changed' && topic === null && same.length > 0 && (
            <Board title={t('compare.unchanged')}>
              <ul className="grid gap-2">
                {same.map((entry) => (
                  <li key={entry.entryId} className="flex items-center gap-3">
                    {entry.after && <SignIcon sign={entry.after.content.icon} size={26} />}
                    {entry.titleOfficer}
                  </li>
                ))}
              </ul>
            </Board>
          )}
        </div>
      </Columns>
    </>
  );
}

function CountSentences({ comparison: { counts, header } }: { comparison: Comparison }) {
  const { t } = useTranslation('versions');
  const { changed, added, removed, same } = counts;
  const strong = [
    ...(changed > 0 ? [t('compare.countChanged', { count: changed })] : []),
    ...(added > 0 ? [t('compare.countAdded', { count: added })] : []),
    ...(removed > 0 ? [t('compare.countRemoved', { count: removed })] : []),
    ...(changed + added + removed + header.length === 0 ? [t('compare.nothing')] : []),
  ];
  return (
    <p className="mt-4 mb-3 text-lead" role="status">
      <strong>{strong.join(' ')}</strong> {same > 0 && t('compare.countSame', { count: same })}
    </p>
  );
}
