/** What a link to the welcome page carries behind its hash, where no server log sees it. */
export interface WelcomeLink {
  /** One-time code of a person whom a steward added. */
  code: string | null;
  /** Token of the link that the first start prints. */
  firstSteward: string | null;
}

export function readWelcomeHash(hash: string): WelcomeLink {
  const values = new URLSearchParams(hash.replace(/^#/u, ''));
  return { code: filled(values.get('code')), firstSteward: filled(values.get('first-steward')) };
}

function filled(value: string | null): string | null {
  return value === null || value === '' ? null : value;
}
