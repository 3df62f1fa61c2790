import { healthSchema } from '../../shared/contracts/accounts';
import { AppError } from '../../shared/errors';
import type { AppDeps } from '../app-deps';
import { publicRoute, type Route } from './define-route';

export const healthRoutes = ({ dataSource, config, demoAccounts }: AppDeps): Route[] => [
  publicRoute({
    method: 'get',
    path: '/health',
    summary: 'Whether the server and its database answer',
    access: 'public',
    answer: { status: 200, schema: healthSchema },
    errors: ['unavailable'],
    handle: async () => {
      await dataSource.query('SELECT 1').catch(() => {
        throw new AppError('unavailable', { reason: 'database' });
      });
      return {
        status: 'ok' as const,
        mode: config.mode,
        ...(demoAccounts && { demoAccounts: demoAccounts.map(({ role, email, password }) => ({ role, email, password })) }),
      };
    },
  }),
];
