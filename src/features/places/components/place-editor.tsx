import { Check } from 'lucide-react';
import { useCallback, useMemo, useRef, useState } from 'react';
import { flushSync } from 'react-dom';
import { useTranslation } from 'react-i18next';
import { place as placeSchema, type Place } from '#shared/contracts/places.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useDateWords } from '#src/lib/date-words.js';
import { todayIn } from '#src/lib/days.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { KeptNotice } from '#src/ui/kept-notice.js';
import { Columns, Mast, Page, ThumbBar } from '#src/ui/page.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import {
  inputOf,
  PLACE_FIELDS,
  readableOf,
  readDraft,
  type PlaceField,
  type PlaceProblems,
} from '../model/place-draft.js';
import { ClarityBoard } from './clarity-board.js';
import { RainBoard } from './rain-board.js';
import { EffectsSection } from './effects-section.js';
import type { FieldPart } from './place-form-parts.js';
import { previewOf } from '../model/place-preview.js';
import { usePlaceProblemWords } from './place-problem-words.js';
import { RuleBoard } from './rule-board.js';
import { SkylineBoard } from './skyline-board.js';
import { StaleBoard } from './stale-board.js';
import { usePlaceDraft } from './use-place-draft.js';
import { WhereBoard } from './where-board.js';

export interface PlaceEditorProps {
  /** Null for a new place. */
  place: Place | null;
  communityId: string;
  communityName: string;
  backTo: string;
  save: (input: ReturnType<typeof inputOf>, version: number | null) => Promise<Place>;
  isSaving: boolean;
  onSaved: (place: Place) => void;
}

const FORM_ID = 'place-form';

/** The form of a place, new or kept: where it is, its skyline, its air, its rule; and what they do to the dates. */
export function PlaceEditor(props: PlaceEditorProps) {
  const { place, communityId, communityName, backTo, save, isSaving, onSaved } = props;
  const { t } = useTranslation(['places', 'common']);
  const dates = useDateWords();
  const say = useToast();
  const words = useProblemWords();
  const fieldWords = usePlaceProblemWords();
  const state = usePlaceDraft(place, communityId);
  const { draft, base, newer } = state;
  const form = useRef<HTMLFormElement>(null);
  const [left, setLeft] = useState<ReadonlySet<PlaceField>>(new Set());
  const [refused, setRefused] = useState<PlaceProblems>({});
  const [overall, setOverall] = useState<string | null>(null);
  const reading = useMemo(() => readDraft(draft), [draft]);
  // The same object as long as the draft stands still: it is what a computation is asked for.
  const preview = useMemo(() => previewOf(draft), [draft]);
  const { year } = todayIn(draft.timeZone === '' ? null : knownZone(draft.timeZone));

  const { change: changeDraft } = state;
  const change = useCallback<FieldPart['change']>(
    (patch) => {
      setRefused({});
      setOverall(null);
      changeDraft(patch);
    },
    [changeDraft],
  );
  const touch = useCallback((field: PlaceField) => {
    setLeft((before) => (before.has(field) ? before : new Set([...before, field])));
  }, []);
  const part: FieldPart = {
    draft,
    change,
    touch,
    problem: (field) =>
      fieldWords.at(field, refused[field] ?? (left.has(field) ? reading.problems[field] : undefined)),
  };

  const show = (problems: PlaceProblems) => {
    flushSync(() => {
      setLeft(new Set(PLACE_FIELDS));
      setRefused(problems);
      setOverall(words.problem(new ApiProblem({ slug: 'invalid-input', status: 422, detail: '' })));
    });
    const first = PLACE_FIELDS.find((field) => problems[field] !== undefined);
    form.current?.querySelector<HTMLElement>(`#place-${first ?? 'name'}`)?.focus();
  };
  const submit = async () => {
    if (newer !== null || (place !== null && !state.changed)) return;
    if (!reading.ok) {
      show(reading.problems);
      return;
    }
    try {
      const saved = await save(reading.input, state.version);
      state.takeSaved(saved, draft);
      setLeft(new Set());
      onSaved(saved);
    } catch (cause) {
      refuse(cause);
    }
  };
  const refuse = (cause: unknown) => {
    const current =
      cause instanceof ApiProblem && cause.slug === 'stale' ? placeSchema.safeParse(cause.current) : null;
    if (current?.success === true) {
      state.showNewer(current.data);
      window.scrollTo({ top: 0 });
      return;
    }
    const problems: PlaceProblems = {};
    for (const { field, code, message } of cause instanceof ApiProblem ? cause.errors : []) {
      const own = PLACE_FIELDS.find((name) => field === name || field.startsWith(`${name}.`));
      if (own !== undefined) problems[own] ??= { kind: 'code', code, message };
    }
    if (Object.keys(problems).length > 0) show(problems);
    else setOverall(words.problem(cause));
  };

  const boards = {
    where: <WhereBoard {...part} year={year} />,
    skyline: <SkylineBoard {...part} />,
    clarity: (
      <>
        <ClarityBoard {...part} />
        <RainBoard {...part} />
      </>
    ),
    rule: <RuleBoard {...part} />,
    effects: (
      <EffectsSection
        communityId={communityId}
        placeId={place?.id ?? null}
        preview={state.changed ? preview : null}
        hasSkyline={draft.skyline.length > 0 || draft.skylineText !== null}
        year={year}
      />
    ),
  };
  const isClosed = place !== null && !state.changed;
  return (
    <Page>
      <Mast
        title={place === null ? t('newTitle') : draft.name.trim() === '' ? place.name : draft.name}
        under={t('under', { village: communityName })}
        backTo={backTo}
      >
        <ThumbBar
          note={
            isClosed
              ? t('nothingChangedNote')
              : state.keptAt === null
                ? undefined
                : t('common:keptDraft', { when: dates.moment(state.keptAt) })
          }
        >
          <Button
            look="main"
            type="submit"
            form={FORM_ID}
            busy={isSaving}
            icon={<Check aria-hidden size={22} />}
            closedBecause={
              newer !== null ? t('stale.takeBecause') : isClosed ? t('nothingChanged') : undefined
            }
          >
            {t('save')}
          </Button>
        </ThumbBar>
      </Mast>
      <form
        id={FORM_ID}
        ref={form}
        noValidate
        className="grid gap-4"
        onSubmit={(event) => {
          event.preventDefault();
          void submit();
        }}
      >
        {state.foundAt !== null && (
          <KeptNotice
            words={t('kept', { when: dates.moment(state.foundAt) })}
            startOverWords={t('startOver')}
            onStartOver={() => {
              state.startOver();
              say(t('thrownAway'));
            }}
          />
        )}
        {newer !== null && (
          <StaleBoard
            key={newer.version}
            base={base}
            theirs={inputOf(newer)}
            mine={readableOf(draft, inputOf(newer))}
            onJoin={(joined) => {
              state.join(joined, newer);
              say(t('stale.taken'));
            }}
          />
        )}
        {overall !== null && (
          <Care blocked role="alert">
            <p>{overall}</p>
          </Care>
        )}
        {place === null ? (
          <>
            <Columns wider="first">
              {boards.where}
              <div className="grid gap-4">{boards.clarity}</div>
            </Columns>
            {boards.skyline}
            <Columns wider="first">
              {boards.effects}
              {boards.rule}
            </Columns>
          </>
        ) : (
          <>
            {boards.skyline}
            {/* In one column the rule comes last; on a wide screen it fills the room under the dates. */}
            <div className="grid gap-4 wide:grid-cols-[minmax(0,7fr)_minmax(0,5fr)] wide:grid-rows-[auto_1fr] wide:items-start wide:gap-x-6">
              {boards.effects}
              <div className="grid gap-4 wide:row-span-2">
                {boards.where}
                {boards.clarity}
              </div>
              {boards.rule}
            </div>
            <p className="text-small text-umber-soft">{t('publishedStay')}</p>
          </>
        )}
      </form>
    </Page>
  );
}

/** A zone that this device does not know must not stop the screen. */
function knownZone(timeZone: string): string | null {
  try {
    new Intl.DateTimeFormat('en', { timeZone });
    return timeZone;
  } catch {
    return null;
  }
}
