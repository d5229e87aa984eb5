import { useQuery } from '@tanstack/react-query';
import { Check, Undo2 } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { SeasonTask } from '#shared/contracts/season-reviews.js';
import { useDateWords } from '#src/lib/date-words.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Fold } from '#src/ui/fold.js';
import { Well } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { seasonTasksQuery, useTick } from '../api/season-queries.js';
import { useSeasonWords } from '../model/season-words.js';

interface SeasonTasksProps {
  calendarId: string;
  isOfficer: boolean;
}

/** Above a draft: what the year before decided for it. Nothing where nothing was decided. */
export function DraftTasks({ calendarId, isOfficer }: SeasonTasksProps) {
  const { t } = useTranslation('season');
  const { data: tasks = [] } = useQuery(seasonTasksQuery(calendarId));
  const [first] = tasks;
  if (first === undefined) return null;
  const { fromYear: year, fromCalendarId } = first;
  const open = tasks.filter(({ done }) => done === null).length;
  return (
    <div className="season-folds">
      <Fold
        title={t('tasks.title', { year })}
        line={open === 0 ? t('tasks.allDone') : t('tasks.open', { count: open })}
      >
        <Tasks calendarId={calendarId} isOfficer={isOfficer} tasks={tasks} />
        <p className="mt-3">
          <Link className="link-line" to={paths.seasonReview(fromCalendarId)}>
            {t('tasks.openReview', { year })}
          </Link>
        </p>
      </Fold>
    </div>
  );
}

/** Beside one entry of a draft: what the year before decided about it. */
export function EntryTasks({ entryId, ...draft }: SeasonTasksProps & { entryId: string }) {
  const { t } = useTranslation('season');
  const { data: tasks = [] } = useQuery(seasonTasksQuery(draft.calendarId));
  const own = tasks.filter((task) => task.entryId === entryId);
  const [first] = own;
  if (first === undefined) return null;
  return (
    <Well>
      <h2 className="text-body">{t('tasks.title', { year: first.fromYear })}</h2>
      <Tasks {...draft} tasks={own} isBesideEntry />
    </Well>
  );
}

interface TasksProps extends SeasonTasksProps {
  tasks: readonly SeasonTask[];
  isBesideEntry?: boolean;
}

function Tasks({ calendarId, isOfficer, tasks, isBesideEntry = false }: TasksProps) {
  const { t } = useTranslation('season');
  const dates = useDateWords();
  const words = useSeasonWords();
  const problemWords = useProblemWords();
  const say = useToast();
  const tick = useTick(calendarId);
  const set = (taskId: string, isDone: boolean) => {
    tick.mutate(
      { taskId, isDone },
      {
        onSuccess: () => {
          say(t(isDone ? 'tasks.ticked' : 'tasks.unticked'));
        },
        onError: (cause) => {
          say(problemWords.problem(cause));
        },
      },
    );
  };
  return (
    <ul className="season-tasks">
      {tasks.map((task) => {
        const { id, title, entryId, by, done } = task;
        const decision = words.decision(task);
        const whole =
          title === null || isBesideEntry ? decision : t('tasks.about', { title, task: decision });
        return (
          <li key={id}>
            <div className="min-w-0">
              <p className="whitespace-pre-line">{whole}</p>
              <p className="text-small text-umber-soft">
                {done === null
                  ? t('tasks.by', { by })
                  : t('decisions.done', { by: done.by, day: dates.day(done.on, 'year') })}
              </p>
              {entryId !== null && !isBesideEntry && (
                <Link className="link-line" to={paths.calendar(calendarId, { entry: entryId })}>
                  {t('tasks.openEntry')}
                </Link>
              )}
            </div>
            {isOfficer && (
              <Button
                look={done === null ? 'plain' : 'quiet'}
                icon={done === null ? <Check aria-hidden size={20} /> : <Undo2 aria-hidden size={20} />}
                aria-label={t(done === null ? 'tasks.tickName' : 'tasks.untickName', { task: whole })}
                onClick={() => {
                  if (!tick.isPending) set(id, done === null);
                }}
              >
                {t(done === null ? 'tasks.tick' : 'tasks.untick')}
              </Button>
            )}
          </li>
        );
      })}
    </ul>
  );
}
