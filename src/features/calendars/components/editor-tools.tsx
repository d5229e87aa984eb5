import { ArrowLeftRight, Check, GitCompareArrows, Layers, Send } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { paths } from '#src/lib/paths.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { StateChip } from '#src/ui/state-chip.js';
import type { Editor } from '../model/use-editor.js';
import type { SaveEntry } from '../model/use-save-entry.js';

/** Why there is nothing to press; said beside the closed button and read with it. */
export function useSaveReason(
  { selected, stale }: Editor,
  { choosingId }: SaveEntry,
): { reason: string; note: string } | null {
  const { t } = useTranslation('calendars');
  if (stale && choosingId === selected?.id)
    return { reason: t('editor.chooseFirst'), note: t('editor.chooseFirstNote') };
  if (selected?.saved && !selected.unsaved) {
    return { reason: t('editor.nothingToSave'), note: t('editor.nothingChanged') };
  }
  return null;
}

export function SaveButton({ editor, saving }: { editor: Editor; saving: SaveEntry }) {
  const { t } = useTranslation('calendars');
  const closed = useSaveReason(editor, saving);
  return (
    <Button
      look="main"
      icon={<Check aria-hidden size={24} />}
      busy={saving.isSaving}
      closedBecause={closed?.reason}
      onClick={() => void saving.save()}
    >
      {t('editor.save')}
    </Button>
  );
}

export function ToolLinks({ editor, onSubmit }: { editor: Editor; onSubmit: () => void }) {
  const { t } = useTranslation('calendars');
  const { calendar, canOrder, shown } = editor;
  return (
    <>
      <ButtonLink to={paths.versions(calendar.id)} icon={<Layers aria-hidden size={20} />}>
        {t('editor.versions')}
      </ButtonLink>
      {editor.lastNumber !== null && (
        <ButtonLink to={paths.compare(calendar.id)} icon={<GitCompareArrows aria-hidden size={20} />}>
          {t('editor.compare')}
        </ButtonLink>
      )}
      <ButtonLink to={paths.moves(calendar.id)} icon={<ArrowLeftRight aria-hidden size={20} />}>
        {t('editor.moves')}
      </ButtonLink>
      {canOrder && shown.length > 0 && (
        <Button icon={<Send aria-hidden className="turns" size={20} />} onClick={onSubmit}>
          {t('editor.submit')}
        </Button>
      )}
    </>
  );
}

/** Draft or locked, where, and what is not saved yet. */
export function DraftState({ editor }: { editor: Editor }) {
  const { t } = useTranslation('calendars');
  const { calendar, lastNumber, unsavedIds } = editor;
  const chip = calendar.locked
    ? t('editor.locked')
    : lastNumber === null
      ? t('editor.draft')
      : t('editor.afterSubmission', { number: lastNumber });
  return (
    <span className="flex flex-wrap items-center gap-x-3 gap-y-1">
      <StateChip state="draft">{chip}</StateChip>
      <span>{t('editor.place', { place: calendar.placeName })}</span>
      {unsavedIds.length > 0 && <span>{t('editor.unsaved', { count: unsavedIds.length })}</span>}
      {!editor.canOrder && !calendar.locked && (
        <span>{t(editor.isKeeper ? 'editor.readOnlyKeeper' : 'editor.readOnly')}</span>
      )}
    </span>
  );
}
