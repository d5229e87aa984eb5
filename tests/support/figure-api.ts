import type { FigureDetail, FigureInput } from '#shared/contracts/figures.js';
import type { Client } from './api.js';

/** Aldebaran and its group under a village's own name; whole, ready to send. */
export function figureInput(changes: Partial<FigureInput> = {}): FigureInput {
  return {
    names: [
      { tag: 'art-x-tazimel', name: 'Ŋɔ́rɛ̃' },
      { tag: 'en', name: 'Seed bowl' },
    ],
    story: 'The bowl is carried up before the rain.',
    variants: [{ toldBy: 'Lower village', text: 'The bowl is empty when it rises.' }],
    memberHrs: [1346, 1409, 1457],
    indicatorHr: 1457,
    patch: null,
    ownDepths: null,
    sharingLevel: 'village',
    ...changes,
  };
}

/** A dark cloud in the Milky Way. */
export const DARK_CLOUD: Partial<FigureInput> = {
  names: [{ tag: 'en', name: 'The dark herd' }],
  memberHrs: [],
  indicatorHr: null,
  patch: { rightAscensionDeg: 246.8, declinationDeg: -24.5, patchClass: 'full-night' },
};

export async function addFigure(officer: Client, changes: Partial<FigureInput> = {}): Promise<FigureDetail> {
  const path = `/api/communities/${officer.communityId}/figures`;
  return (await officer.post(path, figureInput(changes)).expect(201)).body as FigureDetail;
}
