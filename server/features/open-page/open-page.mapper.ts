import { boardOf } from '#shared/calendar/variants.js';
import { isStarLead } from '#shared/calendar/entry-model.js';
import type {
  OpenEntry,
  OpenPage,
  OpenPageState,
  OpenWord,
  PlaceShown,
} from '#shared/contracts/open-page.js';
import type { PlaceSnapshot } from '#shared/contracts/stars.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import type { OpenPageEntity } from '../../db/entities/open-page.entity.js';

export function toOpenPageState(
  row: Pick<OpenPageEntity, 'pageKey' | 'placeShown' | 'switchedOnAt'> | null,
): OpenPageState {
  if (row === null) return { key: null, placeShown: 'name', switchedOnAt: null };
  return { key: row.pageKey, placeShown: row.placeShown, switchedOnAt: row.switchedOnAt.toISOString() };
}

/** Givers, offices, sources and notes are no part of it, and neither is what names a point of the skyline. */
export function toOpenEntry(body: VersionEntryBody): OpenEntry {
  const { entryId, content } = body;
  const { titleVillage, titleOfficer, kind, icon, crop, otherSigns, ifLate, caution, lead } = content;
  return {
    ...{ entryId, titleVillage, titleOfficer, kind, icon, crop, otherSigns, ifLate, caution },
    kindWord: content.kindWord?.word ?? '',
    protectiveWatch: content.protectiveWatch,
    window: boardOf(body).window,
    star: isStarLead(lead) ? { markerKey: lead.markerKey, phenomenon: lead.phenomenon } : null,
  };
}

/** Without the words in which a name stands; null where it is a title, for what has none is nothing. */
export function withoutNames(entry: OpenEntry, named: readonly OpenWord[]): OpenEntry | null {
  if (named.includes('titleOfficer') || named.includes('titleVillage')) return null;
  return { ...entry, ...Object.fromEntries(named.map((word) => [word, ''])) };
}

const ROUNDED_TO_DEG = { nothing: null, name: null, degree: 1, tenth: 0.1 } as const;

export function toOpenPlace(
  shown: PlaceShown,
  { name, latitudeDeg, longitudeDeg }: Pick<PlaceSnapshot, 'name' | 'latitudeDeg' | 'longitudeDeg'>,
): Pick<OpenPage, 'placeName' | 'place'> {
  const roundedToDeg = ROUNDED_TO_DEG[shown];
  const rounded = (deg: number, toDeg: number) => Number((Math.round(deg / toDeg) * toDeg).toFixed(1));
  return {
    placeName: shown === 'nothing' ? null : name,
    place: roundedToDeg && {
      latitudeDeg: rounded(latitudeDeg, roundedToDeg),
      longitudeDeg: rounded(longitudeDeg, roundedToDeg),
      roundedToDeg,
    },
  };
}
