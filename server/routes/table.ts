import { z } from 'zod';
import type { AppDeps } from '../app-deps';
import { describeApi } from '../openapi/describe-api';
import { accountRoutes } from './accounts';
import { albumRoutes } from './albums';
import { checkSettingRoutes } from './check-settings';
import { cutSizeRoutes, formatRoutes } from './cut-sizes';
import { publicRoute, type Route } from './define-route';
import { editRoutes } from './edits';
import { exportRoutes } from './exports';
import { grantRoutes } from './grants';
import { healthRoutes } from './health';
import { jobRoutes } from './jobs';
import { pictureRoutes } from './pictures';
import { pileRoutes } from './piles';
import { printRoutes } from './prints';
import { spreadRoutes } from './spreads';
import { stashRoutes } from './stash';
import { studioRoutes } from './studios';
import { uploadRoutes } from './uploads';

/** The one table of routes: every address under `/api`, with what it needs. MODEL.md 18. */
export function createRoutes(deps: AppDeps): readonly Route[] {
  const { services, dataSource, storage } = deps;
  const routes: Route[] = [
    ...healthRoutes(deps),
    ...accountRoutes(deps),
    ...studioRoutes(services),
    ...grantRoutes(services),
    ...albumRoutes(services),
    ...spreadRoutes(deps),
    ...editRoutes(deps),
    ...printRoutes(services),
    ...uploadRoutes(services),
    ...pictureRoutes({ dataSource, storage, prints: services.prints }),
    ...pileRoutes(services),
    ...cutSizeRoutes(services),
    ...formatRoutes(services),
    ...checkSettingRoutes(services),
    ...exportRoutes({ ...services, storage }),
    ...jobRoutes(services),
    ...stashRoutes(services),
  ];
  const descriptionRoute = publicRoute({
    method: 'get',
    path: '/openapi.json',
    summary: 'This description of every route',
    access: 'public',
    answer: { status: 200, schema: z.looseObject({ openapi: z.string() }) },
    handle: async () => description,
  });
  const all = [...routes, descriptionRoute];
  const description = describeApi(all);
  return all;
}
