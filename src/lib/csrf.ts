/**
 * The session's token, which every write carries back. It is kept in memory only and comes with each answer of
 * the session calls; a new sign-in brings a new one.
 */
let token: string | null = null;

export function keepCsrfToken(next: string): void {
  token = next;
}

export function csrfToken(): string | null {
  return token;
}
