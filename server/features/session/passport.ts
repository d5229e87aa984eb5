import type { Request } from 'express';
import { Passport, type Authenticator } from 'passport';
import { Strategy } from 'passport-local';
import type { Person } from '../../http/actor.js';
import type { CardSignInService } from '../cards/card-sign-in.service.js';
import type { SessionService } from './session.service.js';

declare global {
  // Express types its user here; ours is the person.
  // eslint-disable-next-line @typescript-eslint/no-namespace -- the only place that @types/express offers
  namespace Express {
    interface User {
      id: string;
      email: string | null;
      displayName: string;
      byCardIn?: string;
    }
  }
}

/** One authenticator an application: the package's global one would leak between tests. */
export function createPassport(service: SessionService, cards: CardSignInService): Authenticator {
  const passport = new Passport() as Authenticator;
  passport.use(
    new Strategy({ usernameField: 'email', passwordField: 'password' }, (email, password, done) => {
      service.findByPassword(email.trim().toLowerCase(), password).then(
        (person) => {
          done(null, person ?? false);
        },
        (error: unknown) => {
          done(error);
        },
      );
    }),
  );
  passport.serializeUser((user, done) => {
    done(null, user.id);
  });
  passport.deserializeUser(
    (request: Request, id: string, done: (error: unknown, person?: Person | null) => void) => {
      const { card } = request.session;
      const read = async (): Promise<Person | null> => {
        if (card !== undefined && !(await cards.holds(card, id))) return null;
        return service.findPerson(id);
      };
      read().then(
        (person) => {
          const limits = card === undefined ? {} : { byCardIn: card.communityId };
          done(null, person && { ...slim(person), ...limits });
        },
        (error: unknown) => {
          done(error);
        },
      );
    },
  );
  return passport;
}

/** Nothing but what requests need: no hash travels with them. */
function slim({ id, email, displayName }: Person): Person {
  return { id, email, displayName };
}
