import { ApiProblem } from './api-problem.js';
import { useProblemWords } from './problem-words.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';

interface PageOnItsWayProps {
  title: string;
  backTo?: string;
  /** Null while it is asked for. */
  error: unknown;
  /** Said where there is no such thing, or none for this person. */
  gone: { title: string; why: string };
  trouble: string;
  onRetry: () => void;
}

/** A page whose content is not there: still on its way, gone, or not to be had just now. */
export function PageOnItsWay({ title, backTo, error, gone, trouble, onRetry }: PageOnItsWayProps) {
  const words = useProblemWords();
  const isGone = error instanceof ApiProblem && error.slug === 'not-found';
  return (
    <Page>
      <Mast title={title} {...(backTo !== undefined && { backTo })} />
      {error === null && (
        <Board>
          <Skeleton lines={6} />
        </Board>
      )}
      {isGone && (
        <Board>
          <EmptyState title={gone.title}>{gone.why}</EmptyState>
        </Board>
      )}
      {error !== null && !isGone && (
        <TroubleNote title={trouble} sentence={words.problem(error)} onRetry={onRetry} />
      )}
    </Page>
  );
}
