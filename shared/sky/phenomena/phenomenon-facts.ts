import type { Phenomenon } from '../vocabulary.js';
import type { ArcEnd } from './dark-arc.js';

/** Whether star and Sun stand on the same side of the horizon; thresholds differ. */
export type HorizonSide = 'same' | 'opposite';

export interface PhenomenonFacts {
  crossing: 'rising' | 'setting';
  side: HorizonSide;
  end: ArcEnd;
}

/** What distinguishes the four phenomena [Vogt1920; Ginzel1906]. */
export const PHENOMENON_FACTS: Readonly<Record<Phenomenon, PhenomenonFacts>> = {
  'heliacal-rising': { crossing: 'rising', side: 'same', end: 'dawn' },
  'cosmical-setting': { crossing: 'setting', side: 'opposite', end: 'dawn' },
  'acronychal-rising': { crossing: 'rising', side: 'opposite', end: 'dusk' },
  'heliacal-setting': { crossing: 'setting', side: 'same', end: 'dusk' },
};
