import { civilDateFromIso, dayNumberFromIso } from '#shared/kernel/iso-date.js';
import type { EntryTiming } from '#shared/calendar/entry-model.js';
import type {
  Crossing,
  MarkerYear,
  Occurrence,
  Phenomenon,
  PhenomenonOutcome,
  SkyNote,
} from '#shared/sky/index.js';

/** Made-up facts for the calendar's rules: days are given as `YYYY-MM-DD`, everything else has a plain default. */

export function timing(changes: Partial<EntryTiming> = {}): EntryTiming {
  return {
    kind: 'farm',
    crop: 'long millet',
    lead: { type: 'marker', markerKey: 'pleiades', phenomenon: 'heliacal-rising', occurrence: 1 },
    offsets: { earliestDays: 3, bestFromDays: 7, bestToDays: 23, lastAdvisedDays: 28 },
    hasLastDate: false,
    lastDate: null,
    protectiveWatch: false,
    ...changes,
  };
}

interface OccurrenceFacts {
  expected: string;
  early?: string | null;
  late?: string | null;
  notes?: SkyNote[];
}

export function occurrence({ expected, early = null, late = null, notes = [] }: OccurrenceFacts): Occurrence {
  return {
    expected: crossing(expected),
    early: early === null ? null : crossing(early),
    late: late === null ? null : crossing(late),
    clarity: 'ordinary',
    width: null,
    notes,
  };
}

interface MarkerYearFacts {
  markerKey?: string;
  year?: number;
  outcome?: MarkerYear['outcome'];
  phenomenon?: Phenomenon;
  phenomenonOutcome?: PhenomenonOutcome;
  occurrences?: OccurrenceFacts[];
  notes?: SkyNote[];
}

/** A marker's year in which only one phenomenon matters. */
export function markerYear(facts: MarkerYearFacts = {}): MarkerYear {
  const { markerKey = 'pleiades', year = 2027, outcome = 'rises-and-sets' } = facts;
  const { phenomenon = 'heliacal-rising', phenomenonOutcome = 'dated', occurrences = [], notes = [] } = facts;
  const none = (name: Phenomenon) => ({
    phenomenon: name,
    outcome: 'none-in-this-year' as const,
    occurrences: [],
  });
  return {
    markerKey,
    year,
    outcome,
    outcomeDetail: null,
    phenomena: {
      'heliacal-rising': none('heliacal-rising'),
      'cosmical-setting': none('cosmical-setting'),
      'acronychal-rising': none('acronychal-rising'),
      'heliacal-setting': none('heliacal-setting'),
      [phenomenon]: {
        phenomenon,
        outcome: phenomenonOutcome,
        occurrences: occurrences.map(occurrence),
      },
    },
    nightsHidden: 32,
    notes,
    basis: {
      thresholdSet: 'three-class',
      thresholdSource: 'made up',
      sameSideDeg: 16,
      oppositeSideDeg: 10,
      sameSideShiftDeg: 0,
      oppositeSideShiftDeg: 0,
      skylineRule: 'altitude-difference',
      clarityByMonth: Array.from({ length: 12 }, () => 'ordinary' as const),
      year,
      engineVersion: 'made up',
    },
  };
}

function crossing(iso: string): Crossing {
  const dayNumber = dayNumberFromIso(iso);
  const gregorian = civilDateFromIso(iso);
  return {
    dayNumber,
    gregorian,
    // Thirteen days apart from 1900 to 2100; the rules do not look at this label.
    julian: civilDateFromIso(iso),
    jdUt: dayNumber,
    sunDepressionDeg: 16,
    neededDepressionDeg: 16,
    starAzimuthDeg: 65,
    starAltitudeDeg: 3,
    sunAzimuthDeg: 66,
  };
}
