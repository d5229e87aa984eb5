import { Square } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { Skeleton } from '#src/ui/waiting.js';
import type { Stoppable } from '../model/use-stoppable.js';

interface LongWorkProps {
  isPending: boolean;
  problem: unknown;
  /** What is being done. */
  doing: string;
  /** How far it is; not told aloud each time it changes. */
  detail?: string | null;
  work: Stoppable;
}

/** Work under way with its way out, and what came of it where it did not go through. */
export function LongWork({ isPending, problem, doing, detail = null, work }: LongWorkProps) {
  const { t } = useTranslation('imports');
  const words = useProblemWords();
  if (isPending) {
    return (
      <div className="mt-3 grid gap-2">
        <p role="status">{doing}</p>
        {detail !== null && <p className="text-small">{detail}</p>}
        <Skeleton lines={2} />
        <Button icon={<Square aria-hidden size={20} />} onClick={work.stop}>
          {t('bring.stop')}
        </Button>
      </div>
    );
  }
  if (work.isStopped) return <p role="status">{t('bring.stopped')}</p>;
  if (problem === null) return null;
  return (
    <Care role="alert" className="mt-3">
      <p>{firstSentence(problem, words)}</p>
    </Care>
  );
}

function firstSentence(problem: unknown, words: ReturnType<typeof useProblemWords>): string {
  const [first] = problem instanceof Error && 'errors' in problem ? (problem.errors as FieldSaid[]) : [];
  return first === undefined ? words.problem(problem) : words.field(first.code, first.message);
}

interface FieldSaid {
  code: string;
  message: string;
}
