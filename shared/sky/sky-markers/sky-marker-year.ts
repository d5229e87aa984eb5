import { SkyRangeError } from '../units/sky-range-error.js';
import type { Figure } from '../types.js';
import { ENGINE_VERSION } from '../vocabulary.js';
import type { SkyMarkerKindRules, SkyMarkerPlace } from './kind.js';
import { KINDS } from './kinds.js';
import { skyMarkerTimeOf } from './time-of.js';
import type { SkyMarkerSpec, SkyMarkerYear } from './types.js';
import { SKY_MARKER_KINDS, type SkyMarkerKind } from './words.js';

/** The rules of a kind serve every spec of that kind; the compiler cannot follow a key into its own union. */
function rulesOf(spec: SkyMarkerSpec): SkyMarkerKindRules<SkyMarkerKind> {
  return KINDS[spec.kind] as SkyMarkerKindRules<SkyMarkerKind>;
}

/** Callers from untyped places may hand over anything. */
function kindOf(spec: unknown): unknown {
  return typeof spec === 'object' && spec !== null && 'kind' in spec ? spec.kind : null;
}

/** Throws a SkyRangeError that names the parameter and what would be right. */
export function assertSkyMarkerSpec(
  spec: SkyMarkerSpec,
  figures: readonly Figure[] = [],
  field = 'spec',
): void {
  const kind = kindOf(spec);
  if (!SKY_MARKER_KINDS.some((known) => known === kind)) {
    throw new SkyRangeError(`${field}.kind`, `Give one of these: ${SKY_MARKER_KINDS.join(', ')}.`);
  }
  rulesOf(spec).check(spec, field, figures);
}

export function skyMarkerYearOf(spec: SkyMarkerSpec, place: SkyMarkerPlace): SkyMarkerYear {
  const rules = rulesOf(spec);
  const { outcome, reason, occurrences, toleranceDeg } = rules.compute(spec, place);
  return {
    spec,
    year: place.year.civil.year,
    outcome,
    reason,
    occurrences,
    time: skyMarkerTimeOf(spec),
    sourceKey: rules.sourceKey,
    basis: { range: rules.rangeReason, toleranceDeg, engineVersion: ENGINE_VERSION },
  };
}
