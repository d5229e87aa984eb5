import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import {
  LIKE_CODES,
  wordListInput,
  type ListedWord,
  type WordList,
  type WordListName,
} from '#shared/contracts/word-lists.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSaveWords } from '#src/lib/word-lists.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TickField } from '#src/ui/field.js';
import { CountField, LineField } from '#src/ui/said-fields.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import type { OneListProps } from '../model/one-list.js';
import { useUsualName } from '../model/usual-names.js';
import { withWord } from '../model/word-changes.js';
import { RenameNote } from './rename-note.js';

interface WordFormProps extends OneListProps {
  word: ListedWord;
  onDone: () => void;
}

/** One word, to be written. What somebody else saved meanwhile is said, and nothing typed is lost. */
export function WordForm({ communityId, list, stored, word, onDone }: WordFormProps) {
  const { t } = useTranslation('words');
  const usual = useUsualName(list);
  const words = useProblemWords();
  const say = useToast();
  const { save, take } = useSaveWords(communityId, list);
  const [written, setWritten] = useState<ListedWord>(() =>
    word.key === '' ? { ...word, like: firstLike(list) } : word,
  );
  const [problems, setProblems] = useState<ReadonlyMap<string, string>>(new Map());
  const [overall, setOverall] = useState<string | null>(null);
  const set = (patch: Partial<ListedWord>) => {
    setWritten((before) => ({ ...before, ...patch }));
  };
  const isBuiltIn = written.key !== '' && written.key === written.like;
  const items = withWord(stored.items, written);
  const place = written.key === '' ? items.length - 1 : items.findIndex(({ key }) => key === written.key);
  const ownField = (field: string) => field.replace(`items.${String(place)}.`, '');
  const show = (errors: readonly { field: string; sentence: string }[]) => {
    const own = errors.map(({ field, sentence }) => [ownField(field), sentence] as const);
    setProblems(new Map(own));
    // What is the matter with another word of the list is told above.
    setOverall(own.find(([field]) => field.includes('.'))?.[1] ?? null);
  };
  const refuse = (cause: unknown) => {
    if (!(cause instanceof ApiProblem)) {
      setOverall(words.problem(cause));
    } else if (cause.slug === 'stale' && cause.current) {
      take(cause.current as WordList);
      setOverall(t('stale'));
    } else if (cause.errors.length > 0) {
      show(cause.errors.map(({ field, code, message }) => ({ field, sentence: words.field(code, message) })));
    } else {
      setOverall(words.problem(cause));
    }
  };
  const submit = async () => {
    setProblems(new Map());
    setOverall(null);
    if (!isBuiltIn && written.word.trim() === '') {
      setProblems(new Map([['word', words.field('required')]]));
      return;
    }
    const parsed = wordListInput.safeParse({ version: stored.version, items });
    if (!parsed.success) {
      const { issues } = parsed.error;
      show(issues.map(({ path, message }) => ({ field: path.join('.'), sentence: words.field(message) })));
      return;
    }
    try {
      await save.mutateAsync(parsed.data);
      say(t('saved'));
      onDone();
    } catch (cause) {
      refuse(cause);
    }
  };
  return (
    <form
      noValidate
      className="@container grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      {overall !== null && (
        <Care blocked role="alert">
          <p>{overall}</p>
        </Care>
      )}
      <LineField
        label={t('form.word')}
        hint={isBuiltIn ? t('form.wordHint', { name: usual(written.like) }) : undefined}
        value={written.word}
        problem={problems.get('word')}
        onChange={(value) => {
          set({ word: value });
        }}
      />
      {written.key === '' && list !== 'crops' && (
        <SelectField
          label={t('form.like')}
          hint={t('form.likeHint')}
          value={written.like ?? ''}
          problem={problems.get('like')}
          onChange={(event) => {
            set({ like: event.currentTarget.value as ListedWord['like'] });
          }}
        >
          {LIKE_CODES[list].map((code) => (
            <option key={code} value={code}>
              {usual(code as ListedWord['like'])}
            </option>
          ))}
        </SelectField>
      )}
      {list === 'crops' && (
        <div className="grid gap-4 @min-[34rem]:grid-cols-2">
          <CountField
            label={t('form.fromDays')}
            value={written.fromDays}
            problem={problems.get('fromDays')}
            onChange={(fromDays) => {
              set({ fromDays });
            }}
          />
          <CountField
            label={t('form.toDays')}
            value={written.toDays}
            problem={problems.get('toDays')}
            onChange={(toDays) => {
              set({ toDays });
            }}
          />
        </div>
      )}
      {written.key !== '' && (
        <TickField
          label={t('form.offered')}
          hint={t('form.offeredHint')}
          checked={!written.isHidden}
          onChange={(event) => {
            set({ isHidden: !event.currentTarget.checked });
          }}
        />
      )}
      <RenameNote list={list} stored={word} written={written} />
      <Button type="submit" look="main" full busy={save.isPending}>
        {t('form.save')}
      </Button>
    </form>
  );
}

function firstLike(list: WordListName): ListedWord['like'] {
  return list === 'kinds' ? 'farm' : list === 'operations' ? 'other' : null;
}
