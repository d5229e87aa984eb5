import { useState, type SubmitEvent } from 'react';
import { useTranslation } from 'react-i18next';
import type { z } from 'zod';
import { DECISION_KINDS, type DecisionKind } from '#shared/contracts/season-reviews.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { SelectField } from '#src/ui/field.js';
import { AreaField } from '#src/ui/said-fields.js';
import { Care } from '#src/ui/surfaces.js';

interface Written {
  text: string;
  kind: DecisionKind;
}

interface WordsFormProps<T> {
  /** Under which what is typed stays on this device. */
  name: string;
  label: string;
  hint: string;
  save: string;
  isBusy: boolean;
  /** Asks for the kind of a decision as well, under this label. */
  kindLabel?: string;
  read: (written: Written) => z.ZodSafeParseResult<T>;
  send: (input: T) => Promise<void>;
}

const NOTHING: Written = { text: '', kind: 'earlier' };

function isWritten(value: unknown): value is Written {
  if (typeof value !== 'object' || value === null) return false;
  const { text, kind } = value as Partial<Written>;
  return typeof text === 'string' && DECISION_KINDS.some((each) => each === kind);
}

/** Words about a year. What is typed survives a reload, and a refusal. */
export function WordsForm<T>(props: WordsFormProps<T>) {
  const { name, label, hint, save, isBusy, kindLabel, read, send } = props;
  const { t } = useTranslation('season');
  const words = useProblemWords();
  const keeper = useKeptDraft(name, isWritten);
  const [written, setWritten] = useState(keeper.found?.value ?? NOTHING);
  const [problems, setProblems] = useState<ReadonlyMap<string, string>>(new Map());
  const [overall, setOverall] = useState<string | null>(null);
  const change = (changed: Partial<Written>) => {
    const next = { ...written, ...changed };
    setWritten(next);
    keeper.keepDraft(next, null);
  };
  const submit = async () => {
    const parsed = read(written);
    setOverall(null);
    setProblems(new Map());
    if (!parsed.success) {
      const { issues } = parsed.error;
      setProblems(new Map(issues.map(({ path, message }) => [path.join('.'), words.field(message)])));
      return;
    }
    try {
      await send(parsed.data);
      keeper.dropDraft();
      setWritten(NOTHING);
    } catch (cause) {
      const errors = cause instanceof ApiProblem ? cause.errors : [];
      setProblems(new Map(errors.map(({ field, code, message }) => [field, words.field(code, message)])));
      if (errors.every(({ field }) => field !== 'text' && field !== 'kind')) setOverall(words.problem(cause));
    }
  };
  return (
    <form
      noValidate
      className="mt-3 grid gap-4"
      onSubmit={(event: SubmitEvent<HTMLFormElement>) => {
        event.preventDefault();
        void submit();
      }}
    >
      {overall !== null && (
        <Care blocked role="alert">
          <p>{overall}</p>
        </Care>
      )}
      {kindLabel !== undefined && (
        <SelectField
          label={kindLabel}
          value={written.kind}
          problem={problems.get('kind')}
          onChange={(event) => {
            const kind = DECISION_KINDS.find((each) => each === event.currentTarget.value);
            if (kind !== undefined) change({ kind });
          }}
        >
          {DECISION_KINDS.map((kind) => (
            <option key={kind} value={kind}>
              {t(`kind.${kind}`)}
            </option>
          ))}
        </SelectField>
      )}
      <AreaField
        label={label}
        hint={hint}
        value={written.text}
        problem={problems.get('text')}
        onChange={(text) => {
          change({ text });
        }}
      />
      <p>
        <Button type="submit" busy={isBusy}>
          {save}
        </Button>
      </p>
    </form>
  );
}
