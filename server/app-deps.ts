import type { PassportStatic } from 'passport';
import type { Logger } from 'pino';
import type { SessionStore } from './middleware/session-store';
import type { Role } from '../shared/model/people';
import type { ServiceDeps, Services } from './services/services';

/** Accounts whose passwords everybody may know. */
export type DemoAccounts = readonly { readonly role: Role; readonly email: string; readonly password: string }[];

/** Everything that routes are built from; made once, in the composition root. */
export interface AppDeps extends ServiceDeps {
  readonly log: Logger;
  readonly services: Services;
  readonly sessionStore: SessionStore;
  readonly passport: PassportStatic;
  /** Null in every mode but demo. */
  readonly demoAccounts: DemoAccounts | null;
}
