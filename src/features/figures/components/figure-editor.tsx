import { Check } from 'lucide-react';
import { useState } from 'react';
import { flushSync } from 'react-dom';
import { useTranslation } from 'react-i18next';
import { figureDetail, type Chart, type FigureDetail, type FigureInput } from '#shared/contracts/figures.js';
import type { Language } from '#shared/contracts/people.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { KeptNotice } from '#src/ui/kept-notice.js';
import { Columns, Mast, Page, ThumbBar } from '#src/ui/page.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { fieldOf, inputOf, readDraft, type FigureProblems } from '../model/figure-draft.js';
import { DepthsBoard } from './depths-board.js';
import type { FigurePart } from './figure-form-parts.js';
import { NamesBoard } from './names-board.js';
import { NewerFigure } from './newer-figure.js';
import { SkyBoard } from './sky-board.js';
import { StoryBoard } from './story-board.js';
import { useFigureDraft } from './use-figure-draft.js';

export interface FigureEditorProps {
  /** Null for a new figure. */
  figure: FigureDetail | null;
  communityId: string;
  languages: readonly Language[];
  chart: Chart;
  backTo: string;
  save: (input: FigureInput, version: number | null) => Promise<FigureDetail>;
  isSaving: boolean;
  onSaved: (figure: FigureDetail) => void;
}

const FORM_ID = 'figure-form';

/** The form of a figure, new or kept: names, story, what of the sky it is. What is typed survives a reload. */
export function FigureEditor(props: FigureEditorProps) {
  const { figure, communityId, languages, chart, backTo, save, isSaving, onSaved } = props;
  const { t } = useTranslation(['figures', 'common']);
  const words = useProblemWords();
  const dates = useDateWords();
  const say = useToast();
  const state = useFigureDraft(
    figure,
    communityId,
    languages.map(({ tag }) => tag),
  );
  const { draft } = state;
  const [problems, setProblems] = useState<FigureProblems>({});
  const [overall, setOverall] = useState<string | null>(null);
  const [newer, setNewer] = useState<FigureDetail | null>(null);

  const show = (found: FigureProblems) => {
    flushSync(() => {
      setProblems(found);
      setOverall(words.problem(new ApiProblem({ slug: 'invalid-input', status: 422, detail: '' })));
    });
    const [first] = Object.keys(found);
    document.getElementById(`figure-${first ?? 'names.0'}`)?.focus();
  };
  const refuse = (cause: unknown) => {
    const current =
      cause instanceof ApiProblem && cause.slug === 'stale' ? figureDetail.safeParse(cause.current) : null;
    if (current?.success === true) {
      setNewer(current.data);
      window.scrollTo({ top: 0 });
      return;
    }
    const refused = cause instanceof ApiProblem ? cause.errors : [];
    const found = Object.fromEntries(refused.map(({ field, code }) => [fieldOf(field.split('.')), code]));
    if (refused.length > 0) show(found);
    else setOverall(words.problem(cause));
  };
  const submit = async () => {
    if (newer !== null || (figure !== null && !state.changed)) return;
    const reading = readDraft(draft);
    if (!reading.ok) {
      show(reading.problems);
      return;
    }
    try {
      const saved = await save(reading.input, state.version);
      state.done();
      onSaved(saved);
    } catch (cause) {
      refuse(cause);
    }
  };
  const part: FigurePart = {
    draft,
    change: (patch) => {
      setProblems({});
      setOverall(null);
      state.change(patch);
    },
    problem: (field) => {
      const code = problems[field];
      return code === undefined ? undefined : words.field(code);
    },
  };
  const isClosed = figure !== null && !state.changed;
  const title = draft.names[0]?.name.trim() ?? '';
  const reading = readDraft(draft);
  return (
    <Page>
      <Mast
        title={title === '' ? t(figure === null ? 'new.title' : 'change.title') : title}
        under={t(figure === null ? 'new.under' : 'change.under')}
        backTo={backTo}
      >
        <ThumbBar
          note={
            isClosed
              ? t('change.nothing')
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
            closedBecause={newer !== null ? t('stale.first') : isClosed ? t('change.nothing') : undefined}
          >
            {t('form.save')}
          </Button>
        </ThumbBar>
      </Mast>
      <form
        id={FORM_ID}
        noValidate
        className="grid gap-4"
        onSubmit={(event) => {
          event.preventDefault();
          void submit();
        }}
      >
        {state.foundAt !== null && (
          <KeptNotice
            words={t('form.found', { when: dates.moment(state.foundAt) })}
            startOverWords={t('form.startOver')}
            onStartOver={() => {
              state.startOver();
              say(t('form.thrownAway'));
            }}
          />
        )}
        {newer !== null && (
          <NewerFigure
            theirs={inputOf(newer)}
            mine={reading.ok ? reading.input : inputOf(newer)}
            chart={chart}
            onJoin={(joined) => {
              state.join(joined, newer.version);
              setNewer(null);
              say(t('stale.taken'));
            }}
          />
        )}
        {overall !== null && (
          <Care blocked role="alert">
            <p>{overall}</p>
          </Care>
        )}
        <Columns wider="first">
          <div className="grid gap-4">
            <NamesBoard {...part} languages={languages} />
            <SkyBoard {...part} chart={chart} />
          </div>
          <div className="grid gap-4">
            <StoryBoard {...part} tag={languages[0]?.tag ?? 'en'} />
            <DepthsBoard {...part} />
          </div>
        </Columns>
        {figure !== null && <p className="text-small text-umber-soft">{t('change.publishedStay')}</p>}
      </form>
    </Page>
  );
}
