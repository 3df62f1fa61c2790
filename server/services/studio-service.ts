import type { DataSource } from 'typeorm';
import type { z } from 'zod';
import type { updateStudioSchema } from '../../shared/contracts/accounts';
import { AppError } from '../../shared/errors';
import type { Role, Target } from '../../shared/model/people';
import { TRIM_SETTINGS } from '../../shared/model/trim-settings';
import { MembershipEntity } from '../entities/membership-entity';
import { StudioEntity } from '../entities/studio-entity';

type UpdateStudio = z.output<typeof updateStudioSchema>;

export interface StudioWithRole {
  readonly studio: StudioEntity;
  readonly role: Role;
}

export class StudioService {
  constructor(private readonly dataSource: DataSource) {}

  /** @throws AppError('not-found'). */
  async get(id: string): Promise<StudioEntity> {
    const studio = await this.dataSource.manager.findOneBy(StudioEntity, { id });
    if (!studio) throw new AppError('not-found');
    return studio;
  }

  async locate(id: string): Promise<{ readonly target: Target; readonly subject: StudioEntity }> {
    return { target: { studioId: id }, subject: await this.get(id) };
  }

  /** The studios that a person belongs to, by name. */
  async listOf(userId: string): Promise<StudioWithRole[]> {
    const memberships = await this.dataSource.manager.find(MembershipEntity, {
      where: { userId },
      relations: { studio: true },
      order: { studio: { name: 'ASC', id: 'ASC' } },
    });
    return memberships.flatMap(({ studio, role }) => (studio && !studio.hidden ? [{ studio, role }] : []));
  }

  /** A trimmer that nobody has set follows the unit. */
  async update(studio: StudioEntity, { name, unit, trim = trimForUnit(studio, unit) }: UpdateStudio): Promise<StudioEntity> {
    const changes = {
      ...(name !== undefined && { name }),
      ...(unit !== undefined && { unit }),
      ...(trim !== undefined && { tolerance: trim.tolerance, finestMark: trim.finestMark }),
    };
    if (Object.keys(changes).length > 0) await this.dataSource.manager.update(StudioEntity, { id: studio.id }, changes);
    return this.get(studio.id);
  }

  /** Members with their names: owners first, then by role and name. */
  members(studioId: string): Promise<MembershipEntity[]> {
    return this.dataSource.manager.find(MembershipEntity, {
      where: { studioId },
      relations: { user: true },
      order: { role: 'ASC', user: { name: 'ASC', id: 'ASC' } },
    });
  }
}

function trimForUnit({ unit: before, tolerance, finestMark }: StudioEntity, unit: UpdateStudio['unit']): UpdateStudio['trim'] {
  const usual = TRIM_SETTINGS[before];
  const isUsual = usual.tolerance === tolerance && usual.finestMark === finestMark;
  return unit !== undefined && isUsual ? TRIM_SETTINGS[unit] : undefined;
}
