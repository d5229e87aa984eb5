import { cardsEndpoints } from '#shared/contracts/cards.js';
import { sessionEndpoints, type SessionState } from '#shared/contracts/session.js';
import type { Request, RequestHandler, Router } from 'express';
import type { Authenticator } from 'passport';
import type { Person } from '../../http/actor.js';
import { AppError } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { csrfTokenOf } from '../../http/csrf.js';
import { signInLimits } from '../../http/limits.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import { sessionHash } from '../../http/session-store.js';
import type { CardHolderIn, CardSignInService } from '../cards/card-sign-in.service.js';
import type { HelpingService } from '../helping/helping.service.js';
import { describeBrowser } from './describe-browser.js';
import type { DevicesService } from './devices.service.js';
import { toSessionState } from './session.mapper.js';
import type { SessionService } from './session.service.js';

interface SessionParts {
  service: SessionService;
  cards: CardSignInService;
  devices: DevicesService;
  helping: HelpingService;
  passport: Authenticator;
  clock: Clock;
  /** After so long without use a session that a card opened is over. */
  cardMinutes: number;
}

/** @returns what a session call answers with, for the calls that stand elsewhere and change the session. */
export function sessionRoutes(
  router: Router,
  mount: Mount,
  parts: SessionParts,
): (request: Request, person: Person | null) => Promise<SessionState> {
  const { service, cards, devices, helping, passport, clock, cardMinutes } = parts;
  const stateOf = async (request: Request, person: Person | null) =>
    toSessionState(
      person,
      await service.membershipsOf(person),
      csrfTokenOf(request, true),
      cardMinutes,
      // A sign-in begins anew: nobody is helped yet.
      null,
    );

  // The limits stand before the routes that guess: signing in, codes, and the present password.
  const [perAddress, perAccount] = signInLimits() as [RequestHandler, RequestHandler];
  for (const { path, method } of [
    sessionEndpoints.signIn,
    sessionEndpoints.redeemCode,
    sessionEndpoints.firstSteward,
    sessionEndpoints.resetPassword,
    cardsEndpoints.open,
    cardsEndpoints.choosePin,
    cardsEndpoints.signIn,
  ]) {
    router[method.toLowerCase() as 'post'](path, perAddress, perAccount);
  }

  mount.forAnybody(sessionEndpoints.read, ({ request }, person) => stateOfPresent(request, person));
  mount.forAnybody(sessionEndpoints.signIn, async ({ request }) => {
    const person = await authenticate(passport, request);
    if (person === null) throw new AppError('wrong-credentials');
    await logIn(request, person, clock.now());
    return stateOf(request, person);
  });
  mount.forAnybody(sessionEndpoints.signOut, async ({ request }) => {
    await logOut(request);
    return stateOf(request, null);
  });
  mount.forPerson(sessionEndpoints.changePassword, async ({ request, body }, person) => {
    await service.changePassword(person, body);
    await logIn(request, person, clock.now());
    return stateOf(request, person);
  });
  mount.forAnybody(sessionEndpoints.redeemCode, async ({ request, body }) => {
    const person = await service.redeemCode(body);
    await logIn(request, person, clock.now());
    return stateOf(request, person);
  });
  mount.forAnybody(sessionEndpoints.resetPassword, async ({ request, body }) => {
    const person = await service.resetPassword(body);
    await logIn(request, person, clock.now());
    return stateOf(request, person);
  });
  mount.forAnybody(sessionEndpoints.firstSteward, async ({ request, body }) => {
    const person = await service.setUpFirstSteward(body);
    await logIn(request, person, clock.now());
    return stateOf(request, person);
  });

  const enterByCard = async (request: Request, { person, card }: CardHolderIn) => {
    await logIn(request, person, clock.now());
    request.session.card = card;
    request.session.cookie.maxAge = cardMinutes * 60_000;
    return stateOf(request, person);
  };
  mount.forAnybody(cardsEndpoints.open, ({ body }) => cards.open(body.code));
  mount.forAnybody(cardsEndpoints.choosePin, async ({ request, body }) =>
    enterByCard(request, await cards.choosePin(body.code, body.pin)),
  );
  mount.forAnybody(cardsEndpoints.signIn, async ({ request, body }) =>
    enterByCard(request, await cards.signIn(body.code, body.pin)),
  );

  mount.forPerson(sessionEndpoints.listDevices, async ({ request }, person) =>
    wholeList(await devices.list(person, sessionHash(request.sessionID))),
  );
  mount.forPerson(sessionEndpoints.endDevice, async ({ params }, person) => {
    await devices.end(person, params.deviceId);
    return undefined;
  });
  mount.forPerson(sessionEndpoints.endOtherDevices, async ({ request }, person) => {
    await devices.endOthers(person, sessionHash(request.sessionID));
    return undefined;
  });

  return stateOfPresent;

  /** Reading keeps the token of the session: several tabs share one. */
  async function stateOfPresent(request: Request, person: Person | null) {
    const memberships = await service.membershipsOf(person);
    const helped = await helping.told(request.session, person);
    return toSessionState(person, memberships, csrfTokenOf(request), cardMinutes, helped);
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
function logIn(request: Request, person: Person, at: Date): Promise<void> {
  return new Promise((resolve, reject) => {
    request.logIn(person, (error: unknown) => {
      if (error) {
        reject(asError(error));
        return;
      }
      request.session.device = {
        beganAt: at.toISOString(),
        ...describeBrowser(request.get('User-Agent')),
      };
      resolve();
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
