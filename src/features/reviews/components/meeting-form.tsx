import { useId, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import type { Answer, ElderProgress } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { More } from '#src/ui/fold.js';
import { FieldFrame, TextField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useTypeMeeting } from '../api/reviews-api.js';
import { EMPTY_PAPER, isPaper, markKey, marksOf, ownAnswers, type Paper } from '../model/paper.js';
import { PaperMark } from './paper-mark.js';

interface MeetingFormProps {
  version: Version;
  elders: readonly ElderProgress[];
  given: readonly Answer[];
}

type Problems = Readonly<Record<string, string>>;

/** Day, witness and picture; then each entry with its elders, as the paper has them. */
export function MeetingForm({ version, elders, given }: MeetingFormProps) {
  const { t } = useTranslation('reviews');
  const words = useProblemWords();
  const say = useToast();
  const navigate = useNavigate();
  const pictureId = useId();
  const { found, keepDraft, dropDraft } = useKeptDraft(`meeting.${version.id}`, isPaper);
  const [paper, setPaper] = useState<Paper>(found?.value ?? EMPTY_PAPER);
  const [picture, setPicture] = useState<File | null>(null);
  const [problems, setProblems] = useState<Problems>({});
  const save = useTypeMeeting({ calendarId: version.calendarId, number: version.number });
  const own = ownAnswers(given);
  const change = (changes: Partial<Paper>) => {
    const next = { ...paper, ...changes };
    setPaper(next);
    setProblems({});
    keepDraft(next, null);
  };

  const keepIt = async () => {
    const marks = marksOf(paper);
    const missing: Record<string, string> = {};
    if (paper.heldOn === '') missing['heldOn'] = words.field('required');
    if (paper.witness.trim() === '') missing['witness'] = words.field('required');
    if (marks.length === 0) missing['answers'] = t('meeting.nothing');
    for (const { answer, note, elderId, entryId } of marks) {
      if (answer !== 'change-this' || note !== '') continue;
      missing[markKey(elderId, entryId)] = words.field('say-what-to-change');
    }
    if (picture === null) missing['picture'] = t('meeting.pictureMissing');
    setProblems(missing);
    if (picture === null || Object.keys(missing).length > 0) return;
    try {
      const body = { heldOn: paper.heldOn, witness: paper.witness.trim(), answers: marks };
      const { written, stood } = await save.mutateAsync({ body, picture });
      dropDraft();
      say(
        [
          t('meeting.saved', { count: written }),
          stood.length === 0 ? '' : t('meeting.stood', { count: stood.length }),
        ]
          .filter((sentence) => sentence !== '')
          .join(' '),
      );
      await navigate(paths.version(version.calendarId, version.number));
    } catch (cause) {
      const errors = cause instanceof ApiProblem ? cause.errors : [];
      if (errors.length === 0) say(words.problem(cause));
      setProblems(
        Object.fromEntries(
          errors.map(({ field, code }) => [field === 'file' ? 'picture' : field, words.field(code)]),
        ),
      );
    }
  };

  const numbered = version.entries.map((entry, index) => ({ ...entry, number: index + 1 }));
  const isOpen = ({ entryId }: (typeof numbered)[number]) =>
    elders.some(({ elderId }) => !own.has(markKey(elderId, entryId)));
  const open = numbered.filter(isOpen);
  const answered = numbered.filter((entry) => !isOpen(entry));
  const rowsOf = ({ entryId, content, number }: (typeof numbered)[number]) => (
    <Board key={entryId} title={`${number}. ${content.titleOfficer}`}>
      <div className="paper-marks">
        {elders.map(({ elderId, elderName }) => {
          const key = markKey(elderId, entryId);
          return (
            <PaperMark
              key={key}
              name={elderName}
              own={own.get(key) ?? null}
              value={paper.marks[key] ?? { answer: '', note: '' }}
              problem={problems[key]}
              onChange={(mark) => {
                change({ marks: { ...paper.marks, [key]: mark } });
              }}
            />
          );
        })}
      </div>
    </Board>
  );

  return (
    <form
      className="grid gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void keepIt();
      }}
    >
      <Board>
        <div className="grid gap-4">
          <p>{t('meeting.lead')}</p>
          <TextField
            label={t('meeting.heldOn')}
            type="date"
            value={paper.heldOn}
            problem={problems['heldOn']}
            onChange={(event) => {
              change({ heldOn: event.currentTarget.value });
            }}
          />
          <TextField
            label={t('meeting.witness')}
            value={paper.witness}
            maxLength={120}
            problem={problems['witness']}
            onChange={(event) => {
              change({ witness: event.currentTarget.value });
            }}
          />
          <FieldFrame
            inputId={pictureId}
            label={t('meeting.picture')}
            hint={t('meeting.pictureHint')}
            problem={problems['picture']}
          >
            <input
              id={pictureId}
              type="file"
              className="inp"
              accept="image/jpeg,image/png,image/webp"
              aria-invalid={problems['picture'] !== undefined || undefined}
              onChange={(event) => {
                setPicture(event.currentTarget.files?.[0] ?? null);
                setProblems({});
              }}
            />
          </FieldFrame>
        </div>
      </Board>
      {open.map(rowsOf)}
      {answered.length > 0 && (
        <More label={t('meeting.allOwn', { count: answered.length })}>
          <div className="grid gap-4">{answered.map(rowsOf)}</div>
        </More>
      )}
      {problems['answers'] !== undefined && <p role="alert">{problems['answers']}</p>}
      <Button type="submit" look="main" full busy={save.isPending}>
        {t('meeting.save')}
      </Button>
    </form>
  );
}
