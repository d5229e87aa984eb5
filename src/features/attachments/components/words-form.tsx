import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import {
  attachmentWords,
  WORDS_KINDS,
  WORDS_MAX,
  type Attachment,
  type AttachmentWords,
} from '#shared/contracts/attachments.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TextAreaField, TickField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useSaveWords } from '../api/attachments-api.js';
import { useLanguageNames } from '../model/use-language-names.js';

interface WordsFormProps {
  attachment: Attachment;
  /** The text that is changed; null for a new one. */
  before: AttachmentWords | null;
  onDone: () => void;
}

const isText = (value: unknown): value is string => typeof value === 'string';

/** Writes out what was said, or translates it. What is typed survives a reload. */
export function WordsForm({ attachment, before, onDone }: WordsFormProps) {
  const { t } = useTranslation(['attachments', 'common']);
  const problems = useProblemWords();
  const say = useToast();
  const save = useSaveWords(attachment);
  const { languages, nameOf } = useLanguageNames(attachment.communityId);
  const hasWords = attachment.words.some(({ kind }) => kind === 'words');
  const [kind, setKind] = useState(before?.kind ?? (hasWords ? 'translation' : 'words'));
  const [chosenLanguage, setLanguage] = useState(before?.language ?? null);
  const spoken = attachment.language ?? '';
  const other = languages.find(({ tag }) => tag !== spoken)?.tag ?? spoken;
  const language = chosenLanguage ?? (kind === 'words' ? spoken : other);
  const { found, keepDraft, dropDraft } = useKeptDraft(`words.${attachment.id}.${kind}`, isText);
  const [text, setText] = useState(found?.value ?? before?.text ?? '');
  const [isChecked, setIsChecked] = useState(before?.checkedBySpeaker ?? false);
  const [newer, setNewer] = useState<AttachmentWords | null>(null);
  const [problem, setProblem] = useState<string | undefined>(undefined);

  const saveOver = async (version: number | null) => {
    if (text.trim() === '') {
      setProblem(problems.field('required'));
      return;
    }
    try {
      await save.mutateAsync({ kind, language, text, checkedBySpeaker: isChecked, version });
    } catch (cause) {
      const theirs = newerWords(cause);
      if (theirs === null) setProblem(problems.problem(cause));
      else setNewer(theirs);
      return;
    }
    dropDraft();
    say(t('words.saved'));
    onDone();
  };
  return (
    <form
      className="grid gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void saveOver(newer?.version ?? before?.version ?? null);
      }}
    >
      {before === null && (
        <PickGroup
          label={t('words.kind')}
          value={kind}
          options={WORDS_KINDS.map((value) => ({
            value,
            label: t(value === 'words' ? 'words.kindWords' : 'words.kindTranslation'),
          }))}
          onChange={setKind}
        />
      )}
      {before === null && (
        <SelectField
          label={t('about.language')}
          value={language}
          onChange={(event) => {
            setLanguage(event.currentTarget.value);
          }}
        >
          {[...new Set([spoken, ...languages.map(({ tag }) => tag)])].map((tag) => (
            <option key={tag} value={tag}>
              {nameOf(tag)}
            </option>
          ))}
        </SelectField>
      )}
      <TextAreaField
        label={t('words.text')}
        rows={6}
        lang={language}
        maxLength={WORDS_MAX}
        value={text}
        problem={problem}
        onChange={(event) => {
          setText(event.currentTarget.value);
          setProblem(undefined);
          keepDraft(event.currentTarget.value, before?.version ?? null);
        }}
      />
      <TickField
        label={t('words.checkedTick')}
        checked={isChecked}
        onChange={(event) => {
          setIsChecked(event.currentTarget.checked);
        }}
      />
      {newer !== null && (
        <Care role="alert">
          <p>
            <strong>{t('words.staleTitle')}</strong>
          </p>
          <p>{t('words.stale', { name: newer.authorName })}</p>
          <p className="own-words my-2 whitespace-pre-line" lang={newer.language}>
            {newer.text}
          </p>
          <Button
            onClick={() => {
              dropDraft();
              onDone();
            }}
          >
            {t('words.takeTheirs')}
          </Button>
        </Care>
      )}
      <Button type="submit" look="main" full busy={save.isPending}>
        {newer === null ? t('words.save') : t('words.saveMine')}
      </Button>
      <Button look="quiet" onClick={onDone}>
        {t('common:cancel')}
      </Button>
    </form>
  );
}

/** What somebody else saved meanwhile; null where that is not what stood in the way. */
function newerWords(cause: unknown): AttachmentWords | null {
  if (!(cause instanceof ApiProblem) || cause.slug !== 'stale') return null;
  return attachmentWords.safeParse(cause.current).data ?? null;
}
