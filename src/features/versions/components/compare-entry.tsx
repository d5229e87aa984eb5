import { Fragment } from 'react';
import { useTranslation } from 'react-i18next';
import type { Comparison, EntryComparison } from '#shared/contracts/versions.js';
import { Chip, type ChipTone } from '#src/ui/chip.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { StateIcon, type StateIconKey } from '#src/ui/icons/state-icon.js';
import { WhyMovedLines } from '#src/lib/why-moved-lines.js';
import type { ChangeTopic } from '../model/change-topics.js';
import { changeWord, type ChangeWord } from '../model/entry-change.js';
import { entrySentences, paragraphs, sentencesAbout, type CompareWords } from '../model/entry-sentences.js';
import { skyReasons } from '../model/header-sentences.js';
import { BeforeNow } from './before-now.js';
import { SentenceLine } from './sentence-line.js';
import type { CompareReasons } from './use-compare-reasons.js';

interface CompareEntryProps {
  entry: EntryComparison;
  comparison: Comparison;
  words: CompareWords;
  reasons: CompareReasons;
  topic: ChangeTopic | null;
}

const CHIPS: Record<ChangeWord, { icon: StateIconKey; tone: ChipTone }> = {
  added: { icon: 'added', tone: 'plain' },
  removed: { icon: 'removed', tone: 'plain' },
  changed: { icon: 'changes-asked', tone: 'plain' },
  words: { icon: 'words-only', tone: 'plain' },
  same: { icon: 'same', tone: 'plain' },
};

/** One entry: what changed in a sentence, the bars before and now, then why and who. */
export function CompareEntry({ entry, comparison, words, reasons, topic }: CompareEntryProps) {
  const { t } = useTranslation('versions');
  const word = changeWord(entry);
  const chip = CHIPS[word];
  const told = paragraphs(sentencesAbout(entrySentences(entry, comparison.year, words), topic));
  const ofDays = topic === null || topic === 'dates';
  const icon = (entry.after ?? entry.before)?.content.icon;
  const markerMoved = entry.fields.some(({ field }) => field === 'dates.marker');
  const because = markerMoved && ofDays && entry.why === undefined ? skyReasons(comparison.header) : [];
  const who = reasons(entry);
  return (
    <section className="board compared" aria-label={entry.titleOfficer}>
      <div className="flex flex-wrap items-center justify-between gap-2">
        <h2 className="flex items-center gap-3 text-lead">
          {icon !== undefined && <SignIcon sign={icon} size={34} />}
          {entry.titleOfficer}
        </h2>
        <Chip tone={chip.tone} icon={<StateIcon state={chip.icon} size={20} />}>
          {t(`compare.chip.${word}`)}
        </Chip>
      </div>
      <div className="compared-body">
        {told.length === 0 && <p>{t('compare.unchangedOne')}</p>}
        {told.map((sentences) => (
          <p key={sentences[0]?.key}>
            {sentences.map((sentence) => (
              <Fragment key={sentence.key}>
                <SentenceLine sentence={sentence} />{' '}
              </Fragment>
            ))}
          </p>
        ))}
        {ofDays && <BeforeNow entry={entry} year={comparison.year} words={words} />}
        {(because.length > 0 || who.length > 0 || (ofDays && entry.why)) && (
          <div className="mt-2 text-small text-umber-soft">
            {ofDays && entry.why && <WhyMovedLines why={entry.why} />}
            {because.map((sentence) => (
              <p key={sentence.key}>
                <SentenceLine sentence={sentence} />
              </p>
            ))}
            {who.map((line) => (
              <p key={line}>{line}</p>
            ))}
          </div>
        )}
      </div>
    </section>
  );
}
