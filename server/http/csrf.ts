import { csrfSync } from 'csrf-sync';

/** A token in the session that every write must send back in `X-CSRF-Token`. */
const guard = csrfSync({ getTokenFromRequest: (request) => request.get('X-CSRF-Token') });

export const csrfProtection = guard.csrfSynchronisedProtection;
export const csrfTokenOf = guard.generateToken;
