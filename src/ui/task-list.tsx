import { ChevronRight } from 'lucide-react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';

export interface Task {
  key: string;
  icon: ReactNode;
  title: ReactNode;
  detail?: ReactNode;
  /** Under the detail: pegs, for instance. */
  extra?: ReactNode;
  to?: string | undefined;
}

/** What waits: who and what in each line, an arrow where it leads somewhere. */
export function TaskList({ tasks }: { tasks: readonly Task[] }) {
  return (
    <ul className="tasks">
      {tasks.map((task) => (
        <li key={task.key}>
          {task.to === undefined ? (
            <div className="task">
              <TaskWords task={task} />
            </div>
          ) : (
            <Link className="task" to={task.to}>
              <TaskWords task={task} />
              <ChevronRight aria-hidden className="task-go turns" size={24} />
            </Link>
          )}
        </li>
      ))}
    </ul>
  );
}

function TaskWords({ task }: { task: Task }) {
  return (
    <>
      {task.icon}
      <span>
        <span className="task-title">{task.title}</span>
        {task.detail !== undefined && <span className="task-detail">{task.detail}</span>}
        {task.extra}
      </span>
    </>
  );
}
