import { Passport } from 'passport';
import { Strategy } from 'passport-local';
import type { Actor } from '../../db/authorized';
import type { AccountsService } from './accounts.service';

export type LocalPassport = ReturnType<typeof createPassport>;

/** Passport with the local strategy; a session holds the person's id, and each request looks them up anew. */
export function createPassport(accounts: AccountsService) {
  const passport = new Passport();
  passport.use(
    new Strategy({ usernameField: 'email', passwordField: 'password' }, (email, password, done) => {
      accounts.checkPassword(email, password).then(
        (actor) => done(null, actor ?? false),
        (error: unknown) => done(error),
      );
    }),
  );
  passport.serializeUser((actor, done) => done(null, (actor as Actor).userId));
  passport.deserializeUser((userId: number, done) => done(null, accounts.findActor(userId) ?? false));
  return passport;
}
