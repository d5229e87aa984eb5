/** How people measure in the sky: a fist at the end of a straight arm is one hand, about ten degrees. */
export const HAND_DEG = 10;

/** Hands to the nearest half, never negative; 0 means less than a quarter. */
export function halfHands(angleDeg: number): number {
  return Math.max(0, Math.round((angleDeg / HAND_DEG) * 2) / 2);
}

/** `1½`, `2`: the halves as people write them. */
export function handsFigure(hands: number): string {
  const whole = Math.floor(hands);
  if (hands === whole) return String(whole);
  return whole === 0 ? '½' : `${whole}½`;
}

/** Eight ways for an eye to go, clockwise from straight up. */
export const EYE_WAYS = [
  'up',
  'up-right',
  'right',
  'down-right',
  'down',
  'down-left',
  'left',
  'up-left',
] as const;
export type EyeWay = (typeof EYE_WAYS)[number];

/** @param bearingDeg 0° up, 90° to the right */
export function eyeWay(bearingDeg: number): EyeWay {
  const index = ((Math.round(bearingDeg / 45) % 8) + 8) % 8;
  return EYE_WAYS[index] ?? 'up';
}
