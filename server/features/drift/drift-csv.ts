import type { DriftAnswer, DriftEpoch } from '#shared/contracts/drift.js';
import type { Place } from '#shared/contracts/places.js';
import { csvText, type CsvCell } from '#shared/kernel/csv.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { PHENOMENA, type Phenomenon } from '#shared/sky/index.js';
import { fileNameOf } from '../../print/file-name.js';
import { translatorFor, type Translate } from '../../print/translator.js';

/** Spreadsheets read names rightly only after this mark. */
const UTF8_MARK = '\ufeff';

interface Line {
  phenomenon: Phenomenon;
  epoch: DriftEpoch;
  day: DriftEpoch['phenomena'][Phenomenon]['occurrences'][number] | undefined;
}
type Column = [title: string, cellOf: (line: Line) => CsvCell];

/**
 * The drift as a file: a line for each phenomenon, year and occurrence, always the same columns. Place, basis, the line
 * to cite and the caution stand on every line: there they survive sorting and a line that is copied out alone.
 */
export function driftCsv(place: Place, drift: DriftAnswer): { text: string; fileName: string } {
  const t = translatorFor(DEFAULT_LANGUAGE, 'files');
  const columns = columnsOf(place, drift);
  const lines = PHENOMENA.flatMap((phenomenon) =>
    drift.epochs.flatMap((epoch): Line[] => {
      const { occurrences } = epoch.phenomena[phenomenon];
      return occurrences.length === 0
        ? [{ phenomenon, epoch, day: undefined }]
        : occurrences.map((day) => ({ phenomenon, epoch, day }));
    }),
  );
  const rows = [
    columns.map(([title]) => title),
    ...lines.map((line) => columns.map(([, cellOf]) => cellOf(line))),
  ];
  const { from, to } = drift;
  const name = t('driftCsv.fileName', { place: place.name, star: nameOf(drift), from, to });
  return { text: UTF8_MARK + csvText(rows), fileName: fileNameOf(name, 'csv') };
}

function columnsOf(place: Place, drift: DriftAnswer): Column[] {
  const t = translatorFor(DEFAULT_LANGUAGE, 'files');
  const sky = translatorFor(DEFAULT_LANGUAGE, 'sky');
  const constant = (title: string, value: CsvCell): Column => [t(`driftCsv.${title}`), () => value];
  const { basis } = drift;
  const skylineRule = t(`skylineRule.${place.skyline.length === 0 ? 'flat' : basis.skylineRule}`);
  const { engineVersion, sameSideShiftDeg, oppositeSideShiftDeg, thresholdSource: rule } = basis;
  const made = t('basis', { engineVersion, sameSideShiftDeg, oppositeSideShiftDeg, rule, skylineRule });
  return [
    constant('name', nameOf(drift)),
    constant('designation', drift.designation),
    constant('hr', drift.hr),
    [t('driftCsv.phenomenon'), ({ phenomenon }) => sky(`phenomenon.${phenomenon}`)],
    [t('driftCsv.year'), ({ epoch }) => epoch.year],
    [t('driftCsv.gregorian'), ({ day }) => day?.expected.gregorian ?? null],
    [t('driftCsv.gregorianEarly'), ({ day }) => day?.early?.gregorian ?? null],
    [t('driftCsv.gregorianLate'), ({ day }) => day?.late?.gregorian ?? null],
    [t('driftCsv.julian'), ({ day }) => day?.expected.julian ?? null],
    [t('driftCsv.julianEarly'), ({ day }) => day?.early?.julian ?? null],
    [t('driftCsv.julianLate'), ({ day }) => day?.late?.julian ?? null],
    [t('driftCsv.dayNumber'), ({ day }) => day?.expected.dayNumber ?? null],
    [t('driftCsv.sunLongitude'), ({ day }) => (day ? Number(day.sunLongitudeDeg.toFixed(2)) : null)],
    [t('driftCsv.remark'), (line) => remarkOf(line, t)],
    [
      t('driftCsv.pace'),
      ({ phenomenon }) => {
        const pace = drift.daysPerCentury[phenomenon];
        return pace === null ? null : Number(pace.toFixed(2));
      },
    ],
    constant('place', place.name),
    constant('latitude', place.latitudeDeg),
    constant('longitude', place.longitudeDeg),
    constant('cite', `${t('driftCsv.citation', { star: nameOf(drift), place: place.name })} ${made}`),
    constant('caution', t('caution')),
  ];
}

/** Why there is no date, or what stands beside it. */
function remarkOf({ epoch, phenomenon, day }: Line, t: Translate): string {
  if (epoch.outcome !== 'rises-and-sets')
    return t(`starsCsv.outcome.${epoch.outcomeDetail ?? epoch.outcome}`);
  const { outcome } = epoch.phenomena[phenomenon];
  if (outcome !== 'dated') return t(`starsCsv.none.${outcome}`);
  return (day?.notes ?? []).map((note) => t(`starsCsv.note.${note}`)).join('; ');
}

function nameOf({ name, designation }: DriftAnswer): string {
  return name === '' ? designation : name;
}
