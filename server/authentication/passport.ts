import type { Handler, Request } from 'express';
import passportModule, { type Authenticator } from 'passport';
import { Strategy as LocalStrategy } from 'passport-local';
import { findPersonByEmail } from '../models/find-person-by-email.ts';
import { Person } from '../models/person.ts';
import { isRightPassword } from './password-hash.ts';
import { userOf } from './user-of.ts';

type Done = (error: unknown, user?: Express.User | false) => void;

/** One way for an unknown address, somebody without a password or shut out, and a wrong password. */
async function userByPassword(email: string, password: string): Promise<Express.User | false> {
  const person = await findPersonByEmail(email);
  const isRight = await isRightPassword(person?.passwordHash, password);
  return person?.shutOutAt === null && isRight ? userOf(person) : false;
}

/** The person of a session as they are now; nobody where it has been ended since. */
async function userOfSession(id: string, signedInAt?: number): Promise<Express.User | false> {
  const person = await Person.findByPk(id);
  if (person?.shutOutAt !== null || signedInAt === undefined) return false;
  return signedInAt < person.sessionsValidFrom.getTime() ? false : userOf(person);
}

/** Tells a function that wants to be called back what a promise came to. */
function tell(done: Done, promise: Promise<Express.User | false>): void {
  promise.then(
    (user) => {
      done(null, user);
    },
    (error: unknown) => {
      done(error);
    },
  );
}

function configured() {
  // for Express its middleware is what Express takes; its types leave that open
  const made = new passportModule.Passport() as Authenticator<Handler, Handler, Handler>;
  made.use(
    new LocalStrategy({ usernameField: 'email' }, (email, password, done) => {
      tell(done, userByPassword(email, password));
    }),
  );
  made.serializeUser((user, done) => {
    done(null, user.id);
  });
  made.deserializeUser((req: Request, id: string, done: Done) => {
    tell(done, userOfSession(id, req.session.signedInAt));
  });
  return made;
}

/** Sign-in by e-mail and password, and the person of each request's session. */
export const passport = configured();
