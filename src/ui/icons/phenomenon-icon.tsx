import type { ReactNode } from 'react';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { DrawnSvg, type DrawnProps } from './drawn-icon.js';

const STAR = 'M0-8.4 2 -2.6 8.2-2.6 3.2 1 5.1 7 0 3.4-5.1 7-3.2 1-8.2-2.6-2-2.6Z';
const ground = <path d="M3 38H45" stroke="currentColor" strokeWidth={3.4} strokeLinecap="round" />;
const arrow = (d: string) => (
  <path
    d={d}
    fill="none"
    stroke="currentColor"
    strokeWidth={3}
    strokeLinecap="round"
    strokeLinejoin="round"
  />
);
const star = (x: number, y: number) => <path d={STAR} transform={`translate(${String(x)} ${String(y)})`} />;
/** Dawn: the Sun's rim under the edge on the right; dusk: on the left. A filled rim is the Sun still below. */
const sun = (x: number) => <path d={`M${String(x - 7)} 44A7 7 0 0 1 ${String(x + 7)} 44Z`} />;
const rise = arrow('M13 33V18M8.4 22.6 13 18 17.6 22.6');
const set = arrow('M35 18V33M30.4 28.4 35 33 39.6 28.4');

/** East on the left, west on the right: where the star goes, and on which side the Sun waits below. 48 units. */
const drawings: Record<Phenomenon, ReactNode> = {
  'heliacal-rising': (
    <>
      {star(13, 9.6)}
      {rise}
      {ground}
      {sun(13)}
    </>
  ),
  'acronychal-rising': (
    <>
      {star(13, 9.6)}
      {rise}
      {ground}
      {sun(35)}
    </>
  ),
  'heliacal-setting': (
    <>
      {star(35, 9.6)}
      {set}
      {ground}
      {sun(35)}
    </>
  ),
  'cosmical-setting': (
    <>
      {star(35, 9.6)}
      {set}
      {ground}
      {sun(13)}
    </>
  ),
};

export function PhenomenonIcon({
  phenomenon,
  size = 32,
  label,
  className,
}: DrawnProps & { phenomenon: Phenomenon }) {
  return (
    <DrawnSvg size={size} label={label} className={className} box={48}>
      {drawings[phenomenon]}
    </DrawnSvg>
  );
}
