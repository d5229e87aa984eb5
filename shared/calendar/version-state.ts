/** What can become of a submission. The draft has no state: it is there, and open or locked. */
export const VERSION_STATES = [
  'in-review',
  'changes-asked',
  'signed-off',
  'published',
  'replaced',
  'recalled',
] as const;
export type VersionState = (typeof VERSION_STATES)[number];

/**
 * in-review goes on by signatures, or ends when the officer takes it back or an elder asked for a change; a
 * signed-off one may still be taken back until it is published. `changes-asked`, `replaced` and `recalled` are final.
 */
const NEXT: Readonly<Record<VersionState, readonly VersionState[]>> = {
  'in-review': ['signed-off', 'changes-asked'],
  'changes-asked': [],
  'signed-off': ['published', 'changes-asked'],
  published: ['replaced', 'recalled'],
  replaced: [],
  recalled: [],
};

export function mayBecome(from: VersionState, to: VersionState): boolean {
  return NEXT[from].includes(to);
}

/** While a submission is out, the draft is locked: what is reviewed and what is edited must not drift apart. */
export function isOut(state: VersionState): boolean {
  return state === 'in-review' || state === 'signed-off';
}

/** Was published once: everybody of the village may see it, and it has a label. */
export function wasPublished(state: VersionState): boolean {
  return state === 'published' || state === 'replaced' || state === 'recalled';
}

/** Label of the n-th version of a calendar that was ever published, counted from 1: `2027-1`. */
export function versionLabel(year: number, nth: number): string {
  return `${year}-${nth}`;
}
