/** Letters as a pattern that matches just them, for expressions that read Unicode (flag `u`). */
export function escapePattern(text: string): string {
  return text.replace(/[\\^$.*+?()[\]{}|/]/gu, String.raw`\$&`);
}
