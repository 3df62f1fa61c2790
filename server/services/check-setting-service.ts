import type { DataSource, EntityManager } from 'typeorm';
import { CHECK_IDS, type CheckId } from '../../shared/checks/check-ids';
import { findThresholdFault } from '../../shared/checks/join-settings';
import type { UpdateCheckSetting } from '../../shared/contracts/check-settings';
import { CheckSettingEntity } from '../entities/check-setting-entity';
import { StudioEntity } from '../entities/studio-entity';
import { invalidField } from './invalid-field';

/** All spreads of a studio, or one of them. */
export interface CheckScope {
  readonly studioId: string;
  readonly spreadId: string | null;
}

const KNOWN: ReadonlySet<string> = new Set(CHECK_IDS);

export class CheckSettingService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly now: () => Date,
  ) {}

  list(scope: CheckScope): Promise<CheckSettingEntity[]> {
    return listIn(this.dataSource.manager, scope);
  }

  /**
   * Says something about one check; what says nothing any more is forgotten. Two people who set different checks
   * at once do not meet.
   *
   * @throws AppError('invalid-input') for a threshold that the check does not have, or one out of its range.
   */
  async update(scope: CheckScope, checkId: CheckId, { muted, thresholds }: UpdateCheckSetting): Promise<CheckSettingEntity[]> {
    refuseFaults(checkId, thresholds ?? {});
    const scopeId = scope.spreadId ?? scope.studioId;
    return this.dataSource.transaction(async (manager) => {
      // A row that is not there cannot be locked without its neighbours, so a studio's settings change one after the other.
      await manager.findOne(StudioEntity, { select: { id: true }, where: { id: scope.studioId }, lock: { mode: 'pessimistic_write' } });
      const before = await manager.findOneBy(CheckSettingEntity, { scopeId, checkId });
      const next = {
        muted: muted === undefined ? (before?.muted ?? null) : muted,
        thresholds: thresholds === undefined ? (before?.thresholds ?? {}) : (thresholds ?? {}),
      };
      if (next.muted === null && Object.keys(next.thresholds).length === 0) await manager.delete(CheckSettingEntity, { scopeId, checkId });
      else await manager.upsert(CheckSettingEntity, { scopeId, checkId, ...scope, ...next, updatedAt: this.now() }, ['scopeId', 'checkId']);
      return listIn(manager, scope);
    });
  }
}

/** A check that is gone, set by an older version, is left out. */
async function listIn(manager: EntityManager, { studioId, spreadId }: CheckScope): Promise<CheckSettingEntity[]> {
  const rows = await manager.find(CheckSettingEntity, { where: { scopeId: spreadId ?? studioId }, order: { checkId: 'ASC' } });
  return rows.filter(({ checkId }) => KNOWN.has(checkId));
}

function refuseFaults(checkId: CheckId, thresholds: Readonly<Record<string, number>>): void {
  const fault = findThresholdFault(checkId, thresholds);
  if (!fault) return;
  const said = fault.range ? `must be from ${fault.range.min} to ${fault.range.max}` : 'this check has no such limit';
  throw invalidField(`thresholds.${fault.name}`, said);
}
