import { Plus } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { KeptLine } from '#src/lib/kept-line.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import type { Editor } from '../model/use-editor.js';

/** The entries, or what stands in their place: waiting, trouble, nothing yet. */
export function ListState({ editor, children }: { editor: Editor; children: ReactNode }) {
  const { t } = useTranslation('calendars');
  const words = useProblemWords();
  const { entries, shown, canWrite, selection } = editor;
  if (entries.isPending) {
    return (
      <Board>
        <Skeleton lines={6} />
      </Board>
    );
  }
  if (entries.isError) {
    return (
      <TroubleNote
        title={t('editor.trouble')}
        sentence={words.problem(entries.error)}
        onRetry={() => void entries.refetch()}
      />
    );
  }
  if (shown.length > 0) return children;
  return (
    <Board>
      <EmptyState
        title={t('editor.empty')}
        action={
          canWrite &&
          selection.isWide && (
            <Button look="main" icon={<Plus aria-hidden size={22} />} onClick={selection.openNew}>
              {t(editor.isKeeper ? 'editor.addOwn' : 'editor.addFirst')}
            </Button>
          )
        }
      >
        {canWrite ? t('editor.emptyHint') : t('editor.emptyReader')}
      </EmptyState>
      <KeptLine keptCount={editor.keptCount} />
    </Board>
  );
}
