import { sessionEndpoints } from '#shared/contracts/session.js';
import type { Request, RequestHandler, Router } from 'express';
import type { Authenticator } from 'passport';
import type { Person } from '../../http/actor.js';
import { AppError } from '../../http/app-error.js';
import { csrfTokenOf } from '../../http/csrf.js';
import { signInLimits } from '../../http/limits.js';
import type { Mount } from '../../http/mount.js';
import { toSessionState } from './session.mapper.js';
import type { SessionService } from './session.service.js';

export function sessionRoutes(
  router: Router,
  mount: Mount,
  service: SessionService,
  passport: Authenticator,
): void {
  const stateOf = async (request: Request, person: Person | null) =>
    toSessionState(person, await service.membershipsOf(person), csrfTokenOf(request, true));

  // The limits stand before the routes that guess: signing in, codes, and the present password.
  const [perAddress, perAccount] = signInLimits() as [RequestHandler, RequestHandler];
  for (const { path, method } of [
    sessionEndpoints.signIn,
    sessionEndpoints.redeemCode,
    sessionEndpoints.firstSteward,
  ]) {
    router[method.toLowerCase() as 'post'](path, perAddress, perAccount);
  }

  mount.forAnybody(sessionEndpoints.read, ({ request }, person) => stateOfPresent(request, person));
  mount.forAnybody(sessionEndpoints.signIn, async ({ request }) => {
    const person = await authenticate(passport, request);
    if (person === null) throw new AppError('wrong-credentials');
    await logIn(request, person);
    return stateOf(request, person);
  });
  mount.forAnybody(sessionEndpoints.signOut, async ({ request }) => {
    await logOut(request);
    return stateOf(request, null);
  });
  mount.forPerson(sessionEndpoints.changePassword, async ({ request, body }, person) => {
    await service.changePassword(person, body);
    await logIn(request, person);
    return stateOf(request, person);
  });
  mount.forAnybody(sessionEndpoints.redeemCode, async ({ request, body }) => {
    const person = await service.redeemCode(body);
    await logIn(request, person);
    return stateOf(request, person);
  });
  mount.forAnybody(sessionEndpoints.firstSteward, async ({ request, body }) => {
    const person = await service.setUpFirstSteward(body);
    await logIn(request, person);
    return stateOf(request, person);
  });

  /** Reading keeps the token of the session: several tabs share one. */
  async function stateOfPresent(request: Request, person: Person | null) {
    return toSessionState(person, await service.membershipsOf(person), csrfTokenOf(request));
  }
}

function authenticate(passport: Authenticator, request: Request): Promise<Person | null> {
  return new Promise((resolve, reject) => {
    const middleware = passport.authenticate(
      'local',
      (error: unknown, user: Person | false | null | undefined) => {
        if (error) reject(asError(error));
        else resolve(user || null);
      },
    ) as RequestHandler;
    void middleware(request, {} as never, (error?: unknown) => {
      reject(asError(error));
    });
  });
}

/** passport gives the session a new id here, so that an id from before the sign-in opens nothing. */
function logIn(request: Request, person: Person): Promise<void> {
  return new Promise((resolve, reject) => {
    request.logIn(person, (error: unknown) => {
      if (error) reject(asError(error));
      else resolve();
    });
  });
}

function logOut(request: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    request.logOut((error: unknown) => {
      if (error) reject(asError(error));
      else resolve();
    });
  });
}

/** The libraries call back with whatever was thrown. */
function asError(thrown: unknown): Error {
  return thrown instanceof Error ? thrown : new Error('Signing in or out failed', { cause: thrown });
}
