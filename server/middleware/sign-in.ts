import type { Request, Response } from 'express';
import { Passport, type PassportStatic } from 'passport';
import { Strategy as LocalStrategy } from 'passport-local';
import { AppError } from '../../shared/errors';
import type { AccountService } from '../services/account-service';

/** Passport with e-mail and password; the session holds the account's id only. */
export function createPassport(accounts: AccountService): PassportStatic {
  const passport = new Passport() as PassportStatic;
  passport.use(
    new LocalStrategy({ usernameField: 'email', passwordField: 'password' }, (email, password, done) => {
      accounts
        .verify(email, password)
        .then((user) => done(null, user ?? false))
        .catch(done);
    }),
  );
  passport.serializeUser((user, done) => done(null, user.id));
  passport.deserializeUser((id: string, done) => {
    accounts
      .find(id)
      .then((user) => done(null, user ?? false))
      .catch(done);
  });
  return passport;
}

/** Whose e-mail and password the body holds. @throws AppError('sign-in-failed'). */
export function authenticate(passport: PassportStatic, req: Request, res: Response): Promise<Express.User> {
  return new Promise((resolve, reject) => {
    const decide = (error: unknown, user?: Express.User | false | null): void => {
      if (error) reject(error);
      else if (user) resolve(user);
      else reject(new AppError('sign-in-failed'));
    };
    passport.authenticate('local', decide)(req, res, reject);
  });
}

/** Signs in under a new session id, so that an id planted before is worth nothing. */
export const startSession = (req: Request, user: Express.User): Promise<void> =>
  new Promise((resolve, reject) => req.logIn(user, (error: unknown) => (error ? reject(error) : resolve())));

/** Forgets the session here and in the browser. */
export async function endSession(req: Request, res: Response, cookieName: string): Promise<void> {
  await new Promise<void>((resolve, reject) => req.session.destroy((error: unknown) => (error ? reject(error) : resolve())));
  res.clearCookie(cookieName, { path: '/', httpOnly: true, sameSite: 'lax' });
}
