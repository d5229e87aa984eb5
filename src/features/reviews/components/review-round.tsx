import { ArrowLeft } from 'lucide-react';
import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Link, useSearchParams } from 'react-router-dom';
import type { Answer, ElderProgress } from '#shared/contracts/reviews.js';
import type { Version, VersionEntry } from '#shared/contracts/versions.js';
import { useRoles } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';
import { useActing, useSession } from '#src/lib/session.js';
import { ProgressPegs } from '#src/ui/pegs.js';
import { Page } from '#src/ui/page.js';
import { answersOf, nextOpen } from '../model/answers-of.js';
import { useFocusOnMove } from '../model/use-focus-on-move.js';
import { AnswerFoot } from './answer-foot.js';
import { EntrySteps } from './entry-steps.js';
import { EntryView } from './entry-view.js';
import { ForWhom, type Spokesman, type SpokesmanProblem } from './for-whom.js';
import type { Speak } from './note-panel.js';
import { OthersWords } from './others-words.js';
import { ReviewEnd } from './review-end.js';

/** What belongs to an entry besides its words: voices, notes, who may see it. */
export type About = (entry: VersionEntry) => ReactNode;
/** The recorder of a voice about an entry. */
export type SpeakAbout = (entry: VersionEntry, done: Parameters<Speak>[0]) => ReactNode;

const END = 'end';

/** Goes through the entries; the address holds where one is, so that going back and a reload keep the place. */
export function ReviewRound({
  version,
  answers,
  about,
  speak,
}: {
  version: Version;
  answers: { items: Answer[]; progress: ElderProgress[] };
  about: About;
  speak: SpeakAbout;
}) {
  const { t } = useTranslation('reviews');
  const { is } = useRoles();
  const { helping } = useSession();
  const me = useActing().id;
  const [spokesman, setSpokesman] = useState<Spokesman>({ elderId: '', witness: '', pin: '' });
  const [missing, setMissing] = useState<SpokesmanProblem>({});
  const speaksForSelf = is('elder') || helping !== undefined;
  const elderId = speaksForSelf ? me : spokesman.elderId;
  const elderName = answers.progress.find((each) => each.elderId === elderId)?.elderName ?? '';

  const { entries, header, calendarId, number } = version;
  const entryIds = entries.map((entry) => entry.entryId);
  const given = answersOf(answers.items, elderId);
  const [search, setSearch] = useSearchParams();
  const wanted = search.get('entry');
  const firstOpen = nextOpen(entryIds, given, -1);
  const found = entryIds.indexOf(wanted ?? '');
  const index =
    wanted === END
      ? entries.length
      : found >= 0
        ? found
        : (firstOpen ?? (wanted === null ? entries.length : 0));
  const entry = entries[index];
  const goTo = (next: number) => {
    setSearch({ entry: entryIds[next] ?? END }, { replace: next !== index + 1 });
  };
  useFocusOnMove(index);

  return (
    <Page className="review">
      <div className="review-head">
        <Link to={paths.version(calendarId, number)} className="btn quiet">
          <ArrowLeft aria-hidden size={24} className="turns" />
          {t('leave')}
        </Link>
        <span className="text-umber-soft">
          {entry ? t('entryOf', { entry: index + 1, total: entries.length }) : t('end.title')}
        </span>
      </div>
      <ProgressPegs
        total={entries.length}
        current={entry ? index : null}
        isDone={(each) => given.has(entryIds[each] ?? '')}
        label={
          entry
            ? t('progress', { done: given.size, total: entries.length, entry: index + 1 })
            : t('progressEnd', { done: given.size, total: entries.length })
        }
      />
      {!speaksForSelf && (
        <div className="my-3">
          <ForWhom
            elders={answers.progress}
            value={spokesman}
            onChange={(next) => {
              setSpokesman(next);
              setMissing({});
            }}
            problem={missing}
          />
        </div>
      )}
      {entry ? (
        <>
          <EntryView key={entry.entryId} entry={entry} header={header} />
          <div className="review-entry">
            <OthersWords
              answers={answers.items.filter(
                (each) => each.entryId === entry.entryId && each.elderId !== elderId,
              )}
            />
            {about(entry)}
            <p className="text-umber-soft">{t('silence')}</p>
            <EntrySteps index={index} total={entries.length} goTo={goTo} />
          </div>
          <AnswerFoot
            key={`${entry.entryId} ${elderId}`}
            version={version}
            entryId={entry.entryId}
            answer={given.get(entry.entryId) ?? null}
            spokesman={speaksForSelf ? null : { ...spokesman, name: elderName }}
            speak={speaksForSelf ? (done) => speak(entry, done) : null}
            onMissing={setMissing}
            onAnswered={() => {
              setSpokesman({ ...spokesman, pin: '' });
              const after = new Map(given).set(entry.entryId, null as never);
              goTo(nextOpen(entryIds, after, index) ?? entries.length);
            }}
          />
        </>
      ) : (
        <ReviewEnd
          version={version}
          given={given}
          speaksForSelf={speaksForSelf}
          onOpen={goTo}
          firstOpen={firstOpen}
        />
      )}
    </Page>
  );
}
