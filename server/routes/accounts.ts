import type { Request, RequestHandler } from 'express';
import { sessionSchema, signInSchema, signUpSchema, type Session } from '../../shared/contracts/accounts';
import type { AppDeps } from '../app-deps';
import { addressOf, attemptLimit } from '../middleware/attempt-limit';
import { SESSION_COOKIE } from '../middleware/sessions';
import { authenticate, endSession, startSession } from '../middleware/sign-in';
import { presentSession } from '../presenters/present-studio';
import { publicRoute, type Route } from './define-route';

/** The body has been parsed when limits run. */
const emailOf = (req: Request): string => (req.body as { readonly email: string }).email;

export function accountRoutes(deps: AppDeps): Route[] {
  const { services, passport, config } = deps;
  const { signInPerAccount, signInPerAddress, signUpPerAddress, rateWindowMs: windowMs } = config.limits;

  const tellSession = async (userId: string): Promise<Session> => {
    const [user, studios] = await Promise.all([services.accounts.get(userId), services.studios.listOf(userId)]);
    return presentSession(user, studios, config.mode);
  };
  const signInLimits: RequestHandler[] = [
    attemptLimit(deps, { name: 'sign-in-address', max: signInPerAddress, windowMs, keyOf: addressOf, onlyFailures: true }),
    attemptLimit(deps, { name: 'sign-in-account', max: signInPerAccount, windowMs, keyOf: emailOf, onlyFailures: true }),
  ];
  const signUpLimit = attemptLimit(deps, { name: 'sign-up-address', max: signUpPerAddress, windowMs, keyOf: addressOf, onlyFailures: false });

  return [
    publicRoute({
      method: 'post',
      path: '/accounts',
      summary: 'Sign up: an account and a studio of one’s own',
      access: 'public',
      body: signUpSchema,
      answer: { status: 201, schema: sessionSchema },
      errors: ['already-exists', 'too-many-requests'],
      use: [signUpLimit],
      handle: async ({ body, req }) => {
        const user = await services.accounts.signUp(body);
        await startSession(req, user);
        return tellSession(user.id);
      },
    }),
    publicRoute({
      method: 'post',
      path: '/session',
      summary: 'Sign in',
      access: 'public',
      body: signInSchema,
      answer: { status: 200, schema: sessionSchema },
      errors: ['sign-in-failed', 'too-many-requests'],
      use: signInLimits,
      handle: async ({ req, res }) => {
        const user = await authenticate(passport, req, res);
        await startSession(req, user);
        return tellSession(user.id);
      },
    }),
    publicRoute({
      method: 'get',
      path: '/session',
      summary: 'Who is signed in',
      access: 'signed-in',
      answer: { status: 200, schema: sessionSchema },
      handle: async ({ actor }) => tellSession(actor.userId ?? ''),
    }),
    publicRoute({
      method: 'delete',
      path: '/session',
      summary: 'Sign out',
      access: 'signed-in',
      answer: { status: 204 },
      handle: async ({ req, res }) => endSession(req, res, SESSION_COOKIE),
    }),
  ];
}
