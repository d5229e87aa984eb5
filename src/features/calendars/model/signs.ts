import { useQueries } from '@tanstack/react-query';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { skyMarkerSpec, type SkyMarkerSpec, type SkyMarkerYear } from '#shared/contracts/sky-markers.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { skyMarkerQuery } from '#src/lib/sky-marker-queries.js';

/** Years of signs of the sky that are at hand, by the canonical text of their spec. */
export type Signs = ReadonlyMap<string, SkyMarkerYear>;

/** The year of a sign, or null while it is on its way or cannot be asked for yet. */
export function signOf(signs: Signs, spec: SkyMarkerSpec): SkyMarkerYear | null {
  const found = signs.get(canonicalJson(withoutName(spec)));
  return found ? { ...found, spec } : null;
}

/** What a point or a ridge is called moves no date: a name is typed without asking for the days at each letter. */
function withoutName(spec: SkyMarkerSpec): SkyMarkerSpec {
  switch (spec.kind) {
    case 'sun-azimuth':
      return { ...spec, pointName: '' };
    case 'noon-sun':
      return { ...spec, ridgeName: '' };
    default:
      return spec;
  }
}

/** The specs that contents go by and that can be asked for, each once. */
export function specsOf(contents: readonly Pick<EntryInput, 'lead'>[]): SkyMarkerSpec[] {
  const found = new Map<string, SkyMarkerSpec>();
  for (const { lead } of contents) {
    if (lead.type !== 'sky' || !skyMarkerSpec.safeParse(lead.spec).success) continue;
    const asked = withoutName(lead.spec);
    found.set(canonicalJson(asked), asked);
  }
  return [...found.values()];
}

/** Asks for the years of the signs that are being written; kept while the editor is open. */
export function useSigns(placeId: string, year: number, specs: readonly SkyMarkerSpec[]): Signs {
  return useQueries({
    queries: specs.map((spec) => skyMarkerQuery(placeId, year, spec)),
    combine: bySpec,
  });
}

/** One function for all times: a new one at every drawing would make a new map each time. */
function bySpec(results: readonly { data: SkyMarkerYear | undefined }[]): Signs {
  return new Map(results.flatMap(({ data }) => (data ? [[canonicalJson(data.spec), data] as const] : [])));
}
