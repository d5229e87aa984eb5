import { versionNumber, type VersionSummary } from '#shared/contracts/versions.js';

export interface Sides {
  from: string;
  to: string;
}

/** The numbers that can be compared, newest first; the draft on top for those who see it. */
export function sideChoices(versions: readonly VersionSummary[], seesDrafts: boolean): string[] {
  return [...(seesDrafts ? ['draft'] : []), ...versions.map(({ number }) => String(number))];
}

/**
 * Which two stand beside each other: those that the address names, else the newest against what the village goes by
 * now, else against the one before it. Null while there are not two.
 */
export function sidesOf(
  asked: { from: string | null; to: string | null },
  versions: readonly VersionSummary[],
  seesDrafts: boolean,
): Sides | null {
  const choices = sideChoices(versions, seesDrafts);
  const known = (side: string | null) =>
    versionNumber.safeParse(side).success && side !== null && choices.includes(side) ? side : null;
  const to = known(asked.to) ?? choices.find((side) => side !== known(asked.from)) ?? null;
  if (to === null) return null;
  const published = versions.find(({ state }) => state === 'published');
  const before = choices.slice(choices.indexOf(to) + 1);
  const usual = published && before.includes(String(published.number)) ? String(published.number) : before[0];
  const from = known(asked.from) ?? usual ?? choices.find((side) => side !== to) ?? null;
  return from === null ? null : { from, to };
}
