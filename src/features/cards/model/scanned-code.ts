import { CARD_CODE_LENGTH } from '#shared/contracts/cards.js';

/** The code of a card in what was scanned or in the address: `…#card=CODE`. Null where there is none. */
export function scannedCode(text: string): string | null {
  const code = new URLSearchParams(text.slice(text.indexOf('#') + 1)).get('card') ?? '';
  return letters(code).length === CARD_CODE_LENGTH ? code : null;
}

function letters(code: string): string {
  return code.replace(/[^A-Za-z0-9]/gu, '');
}
