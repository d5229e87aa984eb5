import { Passport, type Authenticator } from 'passport';
import { Strategy } from 'passport-local';
import type { Person } from '../../http/actor.js';
import type { SessionService } from './session.service.js';

declare global {
  // Express types its user here; ours is the person.
  // eslint-disable-next-line @typescript-eslint/no-namespace -- the only place that @types/express offers
  namespace Express {
    interface User {
      id: string;
      email: string;
      displayName: string;
    }
  }
}

/** One authenticator an application: the package's global one would leak between tests. */
export function createPassport(service: SessionService): Authenticator {
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
  passport.deserializeUser((id: string, done) => {
    service.findPerson(id).then(
      (person) => {
        done(null, person && slim(person));
      },
      (error: unknown) => {
        done(error);
      },
    );
  });
  return passport;
}

/** Nothing but what requests need: no hash travels with them. */
function slim({ id, email, displayName }: Person): Person {
  return { id, email, displayName };
}
