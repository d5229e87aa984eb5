const LINE_MAX_OCTETS = 75;

/** One line of a calendar file: a name with its parameters, and a value that is already in the form of its kind. */
export type IcalLine = readonly [name: string, value: string];

/**
 * Lines as RFC 5545 wants them: CRLF after each, and none longer than 75 octets of UTF-8; what is longer goes on in
 * the next line behind one space, never in the middle of a letter.
 */
export function icalText(lines: readonly IcalLine[]): string {
  return lines.map(([name, value]) => `${folded(`${name}:${value}`)}\r\n`).join('');
}

/** Words as a value of the kind TEXT: what has a meaning of its own is masked, and no control character stays. */
export function icalWords(words: string): string {
  return words
    .replace(/\r\n?/gu, '\n')
    .replace(/[\u0000-\u0009\u000b-\u001f\u007f]/gu, ' ')
    .replace(/[\\;,]/gu, (mark) => `\\${mark}`)
    .replaceAll('\n', '\\n');
}

/** `2027-06-07` as `20270607`. */
export function icalDate(date: string): string {
  return date.replaceAll('-', '');
}

/** An instant in universal time, to the second: `20270607T060000Z`. */
export function icalInstant(instant: string): string {
  return instant.replace(/\.\d+/u, '').replace(/[-:]/gu, '');
}

function folded(line: string): string {
  let text = '';
  let octets = 0;
  for (const letter of line) {
    const more = octetsOf(letter);
    if (octets + more > LINE_MAX_OCTETS) {
      text += '\r\n ';
      octets = 1;
    }
    text += letter;
    octets += more;
  }
  return text;
}

function octetsOf(letter: string): number {
  const code = letter.codePointAt(0) ?? 0;
  if (code < 0x80) return 1;
  if (code < 0x800) return 2;
  return code < 0x10000 ? 3 : 4;
}
