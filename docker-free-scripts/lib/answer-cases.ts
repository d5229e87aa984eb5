import {
  type CalendarDate,
  type DepthAtCrossingCase,
  depthAtCrossingYear,
  gregorianOf,
  PHENOMENA,
  type Phenomenon,
  SkyRangeError,
  type StarOutcome,
} from '#shared/sky/index.js';

export type CaseId = string | number | null;
type ByPhenomenon<Value> = Record<Phenomenon, Value[]>;

export type CaseAnswer =
  | { id: CaseId; outcome: StarOutcome; dayNumbers?: ByPhenomenon<number>; gregorian?: ByPhenomenon<string> }
  | { id: CaseId; error: string };

/** Thrown for a file that is not a list of cases at all. */
export class CasesFileError extends Error {}

/** The cases of a file's text, each still unchecked. */
export function readCases(text: string): unknown[] {
  const file: unknown = JSON.parse(text);
  const cases: unknown =
    typeof file === 'object' && file !== null && 'cases' in file ? file.cases : undefined;
  if (!Array.isArray(cases)) throw new CasesFileError('it has no list named "cases"');
  return cases;
}

/** −1500-02-24 as "-1500-02-24"; years have at least four digits. */
export function dateText({ year, month, day }: CalendarDate): string {
  const two = (value: number): string => String(value).padStart(2, '0');
  return `${year < 0 ? '-' : ''}${String(Math.abs(year)).padStart(4, '0')}-${two(month)}-${two(day)}`;
}

function byPhenomenon<Value>(of: (phenomenon: Phenomenon) => Value[]): ByPhenomenon<Value> {
  return Object.fromEntries(
    PHENOMENA.map((phenomenon) => [phenomenon, of(phenomenon)]),
  ) as ByPhenomenon<Value>;
}

function answer(id: CaseId, question: DepthAtCrossingCase): CaseAnswer {
  const { outcome, dayNumbers } = depthAtCrossingYear(question);
  if (!dayNumbers) return { id, outcome };
  return {
    id,
    outcome,
    dayNumbers: byPhenomenon((phenomenon) => [...dayNumbers[phenomenon]]),
    gregorian: byPhenomenon((phenomenon) => dayNumbers[phenomenon].map((day) => dateText(gregorianOf(day)))),
  };
}

function idOf(candidate: unknown): CaseId {
  if (typeof candidate !== 'object' || candidate === null || !('id' in candidate)) return null;
  return typeof candidate.id === 'string' || typeof candidate.id === 'number' ? candidate.id : null;
}

/** One answer per case, in the order of the cases. Members that the command does not know are left alone. */
export function answerCases(cases: readonly unknown[]): CaseAnswer[] {
  const usedIds = new Set<CaseId>();
  return cases.map((candidate, index) => {
    const id = idOf(candidate);
    const name = id === null ? `Case at position ${index + 1}` : `Case ${id}`;
    if (id === null) return { id, error: `${name}: id: Give a text or a number that names the case.` };
    if (usedIds.has(id))
      return { id, error: `${name}: id: Give each case an id of its own; this one was used before.` };
    usedIds.add(id);
    try {
      return answer(id, candidate as DepthAtCrossingCase);
    } catch (error) {
      if (error instanceof SkyRangeError) return { id, error: `${name}: ${error.message}` };
      throw error;
    }
  });
}
