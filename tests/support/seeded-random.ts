/**
 * Numbers in [0, 1) that are the same on every run: xorshift on 32 bits, enough for choosing moments and
 * samples in tests.
 */
export function randomFrom(seed: number): () => number {
  let state = seed | 0 || 1;
  return () => {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    return (state >>> 0) / 2 ** 32;
  };
}
