import { In, type DataSource } from 'typeorm';
import { pictureParamsSchema } from '../../shared/contracts/prints';
import type { Actor, Target } from '../../shared/model/people';
import { FileEntity } from '../entities/file-entity';
import type { PrintEntity } from '../entities/print-entity';
import { SpreadPrintEntity } from '../entities/spread-print-entity';
import type { PrintService } from '../services/print-service';
import { pictureKey, type Storage } from '../storage/storage';
import { guardedRoute } from './define-route';
import { sendStored } from './send-stored';

interface Deps {
  readonly dataSource: DataSource;
  readonly prints: PrintService;
  readonly storage: Storage;
}

/** A print's picture never changes, so a browser may keep it for good; only its own, since it is private. */
const CACHE_CONTROL = 'private, max-age=31536000, immutable';

export const pictureRoutes = ({ dataSource, prints, storage }: Deps) => [
  guardedRoute({
    method: 'get',
    path: '/pictures/:printId/:size',
    summary: "A print's picture in one of the sizes for screens, upright and without metadata.",
    params: pictureParamsSchema,
    answer: { status: 200, streams: ['image/webp'] },
    needs: 'picture:see',
    on: async ({ printId }, _query, actor) => {
      const { target, subject } = await prints.locate(printId);
      return { target: { ...target, ...(await grantedSpread(dataSource, actor, subject)) }, subject };
    },
    handle: async ({ subject, params, req, res }) => {
      const { sha256 } = await dataSource.manager.findOneByOrFail(FileEntity, { id: subject.fileId });
      res.set({
        'Cache-Control': CACHE_CONTROL,
        'Content-Type': 'image/webp',
        'X-Content-Type-Options': 'nosniff',
        ETag: `"${sha256}-${params.size}"`,
      });
      if (req.fresh) {
        res.status(304).end();
        return;
      }
      const stored = await storage.get(pictureKey(subject.studioId, sha256, params.size));
      if (!stored) throw new Error(`The ${params.size} picture of ${sha256} is not in the storage`);
      await sendStored(req, res, stored);
    },
  }),
];

/** A link or a phone sees the prints of its one spread. */
async function grantedSpread(dataSource: DataSource, actor: Actor, print: PrintEntity): Promise<Pick<Target, 'spreadId'>> {
  const spreadIds = actor.grants.flatMap(({ scope }) => ('spreadId' in scope ? [scope.spreadId] : []));
  if (spreadIds.length === 0) return {};
  const use = await dataSource.manager.findOneBy(SpreadPrintEntity, { printId: print.id, spreadId: In(spreadIds) });
  return use ? { spreadId: use.spreadId } : {};
}
