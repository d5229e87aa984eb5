import { communityInput, type Community, type CommunityInput } from '#shared/contracts/people.js';

/** What the form edits: everything of the community but its id and version. */
export function settingsOf({ id: _id, version: _version, ...settings }: Community): CommunityInput {
  return settings;
}

/** A draft kept by an older release may have another shape; then it is left alone. */
export function isSettings(value: unknown): value is CommunityInput {
  return communityInput.safeParse(value).success || looksLikeSettings(value);
}

/** Unfinished input is no valid input, but has the same fields. */
function looksLikeSettings(value: unknown): boolean {
  if (typeof value !== 'object' || value === null) return false;
  return Object.keys(communityInput.shape).every((field) => field in value);
}

export const SETTING_GROUPS = [
  'name',
  'villageLanguage',
  'officerLanguage',
  'yearStart',
  'localMonths',
  'moonNames',
  'weatherContact',
  'agricultureContact',
  'signOffRule',
] as const satisfies readonly (keyof CommunityInput)[];
export type SettingGroup = (typeof SETTING_GROUPS)[number];

/** Settings that differ between two states, in the order of the form. */
export function differingSettings(a: CommunityInput, b: CommunityInput): SettingGroup[] {
  return SETTING_GROUPS.filter((field) => JSON.stringify(a[field]) !== JSON.stringify(b[field]));
}
