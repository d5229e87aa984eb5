import type * as Library from 'geo-tz/all';

/** Zones of the open sea: offsets by longitude, which nobody on land keeps. */
const SEA = 'Etc/';

let library: Promise<typeof Library> | null = null;

/**
 * The IANA zone that people at a point keep, from the outlines of all zones. At sea the zone by longitude; null
 * where several of those meet (the poles, the date line) or the zone is younger than this runtime's zone data.
 * Where two zones claim the same land the first of the list answers, and the person can choose another one.
 */
export async function timeZoneAt(latitudeDeg: number, longitudeDeg: number): Promise<string | null> {
  // Loaded at the first question: reading it takes a quarter of a second that a start should not wait for.
  library ??= import('geo-tz/all');
  const zones = (await library).find(latitudeDeg, longitudeDeg).filter(isKnown);
  const onLand = zones.find((zone) => !zone.startsWith(SEA));
  return onLand ?? (zones.length === 1 ? (zones[0] ?? null) : null);
}

function isKnown(zone: string): boolean {
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
    return true;
  } catch {
    return false;
  }
}
