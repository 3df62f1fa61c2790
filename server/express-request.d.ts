import type { Actor } from '../shared/model/people';

declare global {
  // The namespaces that Express and passport leave open for this; there is no other way to type `req`.
  namespace Express {
    interface Request {
      /** Who asks; nobody until `loadActor` has run. */
      actor: Actor;
    }
    interface User {
      readonly id: string;
    }
  }
}

declare module 'express-session' {
  interface SessionData {
    /** What passport keeps: the account's id. */
    passport?: { user?: string };
  }
}
