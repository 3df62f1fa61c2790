import type { RequestHandler } from 'express';
import session from 'express-session';
import type { SessionStore } from './session-store';

export const SESSION_COOKIE = 'pairleaf.session';
export const SESSION_MAX_AGE_MS = 14 * 24 * 60 * 60_000;

/** Cookie sessions: nothing is stored for people who never signed in, and use prolongs what there is. */
export function sessions(store: SessionStore, secret: string): RequestHandler {
  return session({
    name: SESSION_COOKIE,
    secret,
    store,
    resave: false,
    saveUninitialized: false,
    rolling: true,
    // `auto` is Secure whenever the connection is TLS, as the trusted proxies tell it.
    cookie: { httpOnly: true, sameSite: 'lax', secure: 'auto', maxAge: SESSION_MAX_AGE_MS, path: '/' },
  });
}
