/** "4:05" of a number of seconds, hours counted as minutes. */
export function clockOf(seconds: number): string {
  const whole = Math.max(0, Math.floor(seconds));
  return `${Math.floor(whole / 60)}:${String(whole % 60).padStart(2, '0')}`;
}

export function secondsOf(parts: readonly { part: number; seconds: number | null }[]): number {
  return parts.reduce((sum, { part, seconds }) => (part === 0 ? sum : sum + (seconds ?? 0)), 0);
}
