import { useMemo } from 'react';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { hasSign } from '../model/entry-draft.js';
import type { FormState } from '../model/form-state.js';
import type { Editor } from '../model/use-editor.js';
import { MarkerDialog } from './marker-dialog.js';

const FIRST_STAR = 'pleiades';

interface ChooseLeadProps {
  editor: Editor;
  form: FormState;
  isOpen: boolean;
  onClose: () => void;
}

/** The dialog in which an entry gets what it goes by; choosing on either side makes that the lead. */
export function ChooseLead({ editor, form, isOpen, onClose }: ChooseLeadProps) {
  const { draft, change } = form;
  const { shown } = editor;
  const signsInUse = useMemo(
    () =>
      new Set(
        shown.flatMap(({ content: { lead } }) => (lead.type === 'sky' ? [canonicalJson(lead.spec)] : [])),
      ),
    [shown],
  );
  return (
    <MarkerDialog
      isOpen={isOpen}
      onClose={onClose}
      side={draft.leadType === 'sky' ? 'sky' : 'stars'}
      rows={editor.markers.data?.rows ?? []}
      year={form.year}
      phenomenon={draft.marker.phenomenon}
      chosen={draft.marker.markerKey}
      inUse={form.inUse}
      onChoose={(markerKey) => {
        change(({ marker }) => ({ leadType: 'marker', marker: { ...marker, markerKey, occurrence: 1 } }));
      }}
      sky={{
        placeId: editor.calendar.placeId,
        markers: form.markers ?? new Map(),
        inUse: signsInUse,
        chosen: hasSign(draft.sky) ? draft.sky.spec : null,
        startStar: draft.marker.markerKey === '' ? FIRST_STAR : draft.marker.markerKey,
        onChoose: (spec) => {
          change({ leadType: 'sky', sky: { spec, occurrence: 1 } });
        },
      }}
    />
  );
}
