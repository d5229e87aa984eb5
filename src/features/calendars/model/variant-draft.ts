import type { EntryInput } from '#shared/contracts/calendars.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { variantInput, type VariantInput } from '#shared/contracts/variants.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { contentOf, draftOf, writtenLead, type EntryDraft } from './entry-draft.js';

/** A variant while it is being written: its timing as an entry's draft, and what is its own. */
export interface VariantDraft {
  timing: EntryDraft;
  own: Pick<VariantInput, 'difference' | 'giver' | 'giverId' | 'confidence' | 'basis' | 'note'>;
}

/** A new one begins as the entry is counted; its giver is asked for. */
export function variantDraftOf(entry: EntryInput, saved: VariantInput | null): VariantDraft {
  if (saved === null) {
    const { otherSigns, ifLate } = entry;
    return {
      timing: { ...draftOf({ ...entry, otherSigns, ifLate }), giver: '' },
      own: {
        difference: 'other-marker',
        giver: '',
        giverId: null,
        confidence: 'fair',
        basis: 'handed-down',
        note: '',
      },
    };
  }
  const { lead, offsets, otherSigns, ifLate, sharingLevel, sharing = PLAIN_DETAILS, ...own } = saved;
  return { timing: draftOf({ ...entry, lead, offsets, otherSigns, ifLate, sharingLevel, sharing }), own };
}

/** What would be saved; the contract says what is still missing. */
export function variantOf({ timing, own }: VariantDraft): VariantInput {
  const lead = writtenLead(timing);
  const { offsets, otherSigns, ifLate, sharingLevel, sharing } = contentOf(timing);
  const plain = sharing === undefined || sameJson(sharing, PLAIN_DETAILS);
  return { ...own, lead, offsets, otherSigns, ifLate, sharingLevel, ...(plain ? {} : { sharing }) };
}

/** Codes of what is not accepted yet, by field. */
export function variantProblems(content: VariantInput): Map<string, { code: string }> {
  const found = new Map<string, { code: string }>();
  const parsed = variantInput.safeParse(content);
  for (const { path, message } of parsed.error?.issues ?? []) {
    const field = path.map(String).join('.');
    if (!found.has(field)) found.set(field, { code: message });
  }
  return found;
}
