/** A whole number with a real minus sign. */
export function signed(value: number): string {
  return value < 0 ? `−${String(-value)}` : String(value);
}
