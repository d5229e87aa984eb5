/** The place in a list at which a pointer at height `y` would put an item; `middles` are those of the rows. */
export function placeUnder(y: number, middles: readonly number[]): number {
  const distances = middles.map((middle) => Math.abs(middle - y));
  return Math.max(0, distances.indexOf(Math.min(...distances)));
}
