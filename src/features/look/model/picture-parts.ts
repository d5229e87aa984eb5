import type { LookMoment } from '#shared/contracts/look.js';
import type { PathPoint } from '#src/ui/pictures/look-layout.js';

/** Stretches of a star's way over the skyline: where it is seen, and where it is up but not seen. */
export interface PathParts {
  seen: PathPoint[][];
  light: PathPoint[][];
}

/** Neighbouring stretches share their joint, so that the line has no gap. */
export function pathParts(path: readonly LookMoment[]): PathParts {
  const parts: PathParts = { seen: [], light: [] };
  let run: PathPoint[] = [];
  let kind: 'seen' | 'light' | null = null;
  const close = () => {
    if (kind !== null && run.length > 1) parts[kind].push(run);
  };
  for (const moment of path) {
    const next = !moment.isUp ? null : moment.isSeen ? 'seen' : 'light';
    if (next !== kind) {
      const joint = kind === null ? [] : run.slice(-1);
      close();
      run = next === null ? [] : joint;
      kind = next;
    }
    if (next !== null) run.push({ azimuthDeg: moment.azimuthDeg, altitudeDeg: moment.altitudeDeg });
  }
  close();
  return parts;
}
