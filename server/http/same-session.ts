import type { Request } from 'express';
import type { SessionData } from 'express-session';

/**
 * Whether the session of a call that goes on still stands as it did when it began: the same person, by the same card, helping
 * the same one. It is read anew and not touched, so listening keeps no session alive.
 */
export function sameSession(request: Request): () => Promise<boolean> {
  const { sessionID, sessionStore } = request;
  const began = standing(request.session);
  return async () => {
    const now = await new Promise<SessionData | null>((resolve, reject) => {
      sessionStore.get(sessionID, (error: unknown, session) => {
        if (error) reject(error instanceof Error ? error : new Error('The session could not be read'));
        else resolve(session ?? null);
      });
    });
    return now !== null && standing(now) === began;
  };
}

function standing(session: Partial<SessionData>): string {
  const { passport, card, helping } = session as Partial<SessionData> & { passport?: { user?: string } };
  return JSON.stringify([passport?.user ?? null, card ?? null, helping ?? null]);
}
