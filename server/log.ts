import { pino, type Logger } from 'pino';
import { GRANT_HEADER } from '../shared/contracts/grants';
import type { Config } from './config';

const SECRET_HEADERS = ['cookie', 'authorization', GRANT_HEADER];

/** JSON lines on standard output; what signs somebody in is never written. */
export const createLog = ({ logLevel }: Config): Logger =>
  pino({
    level: logLevel,
    redact: {
      paths: [...SECRET_HEADERS.map((name) => `req.headers["${name}"]`), 'res.headers["set-cookie"]', '*.password', '*.token', '*.passwordHash'],
      censor: '(hidden)',
    },
  });
