import type { EntryInput } from '#shared/contracts/calendars.js';
import type { FigureDetail } from '#shared/contracts/figures.js';
import type { NotedText } from '#src/features/notes/components/notes-panel.js';

const ENTRY_FIELDS = [
  'titleOfficer',
  'titleVillage',
  'crop',
  'notes',
  'otherSigns',
  'ifLate',
  'caution',
] as const;

/** Texts of an entry that a note can quote. */
export function textsOfEntry(content: EntryInput): NotedText[] {
  return ENTRY_FIELDS.map((field) => ({ field, text: content[field] }));
}

/** Texts of a figure that a note can quote. */
export function textsOfFigure({ names, story }: FigureDetail): NotedText[] {
  return [
    { field: 'names', text: names.map(({ name }) => name).join(' · ') },
    { field: 'story', text: story },
  ];
}
