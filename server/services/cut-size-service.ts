import type { DataSource } from 'typeorm';
import type { z } from 'zod';
import type { updateCutSizeSchema } from '../../shared/contracts/cut-sizes';
import { AppError } from '../../shared/errors';
import type { CutSize } from '../../shared/model/cut-size';
import type { Target } from '../../shared/model/people';
import { CutSizeEntity } from '../entities/cut-size-entity';
import { createOnce } from './create-once';

export class CutSizeService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly now: () => Date,
  ) {}

  private async get(id: string): Promise<CutSizeEntity> {
    const cutSize = await this.dataSource.manager.findOneBy(CutSizeEntity, { id });
    if (!cutSize) throw new AppError('not-found');
    return cutSize;
  }

  async locate(id: string): Promise<{ readonly target: Target; readonly subject: CutSizeEntity }> {
    const subject = await this.get(id);
    return { target: { studioId: subject.studioId }, subject };
  }

  list(studioId: string): Promise<CutSizeEntity[]> {
    return this.dataSource.manager.find(CutSizeEntity, { where: { studioId }, order: { createdAt: 'ASC', id: 'ASC' } });
  }

  async create(studioId: string, cutSize: CutSize): Promise<CutSizeEntity> {
    const row = { ...cutSize, sets: [...cutSize.sets], studioId, createdAt: this.now() };
    const made = await createOnce(this.dataSource.manager, CutSizeEntity, row, 'cut size', (existing) => existing.studioId === studioId);
    return made.row;
  }

  async update({ id }: CutSizeEntity, changes: z.output<typeof updateCutSizeSchema>): Promise<CutSizeEntity> {
    if (Object.keys(changes).length > 0) await this.dataSource.manager.update(CutSizeEntity, { id }, changes);
    return this.get(id);
  }

  async remove({ id }: CutSizeEntity): Promise<void> {
    await this.dataSource.manager.delete(CutSizeEntity, { id });
  }
}
