import type { DataSource } from 'typeorm';
import type { z } from 'zod';
import type { createPileSchema, updatePileSchema } from '../../shared/contracts/prints';
import { AppError } from '../../shared/errors';
import type { Target } from '../../shared/model/people';
import { PileEntity } from '../entities/pile-entity';
import { createOnce } from './create-once';

export class PileService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly now: () => Date,
  ) {}

  private async get(id: string): Promise<PileEntity> {
    const pile = await this.dataSource.manager.findOneBy(PileEntity, { id });
    if (!pile) throw new AppError('not-found');
    return pile;
  }

  async locate(id: string): Promise<{ readonly target: Target; readonly subject: PileEntity }> {
    const subject = await this.get(id);
    return { target: targetOfPile(subject), subject };
  }

  list(studioId: string): Promise<PileEntity[]> {
    return this.dataSource.manager.find(PileEntity, { where: { studioId }, order: { position: 'ASC', createdAt: 'ASC', id: 'ASC' } });
  }

  /** A new pile lies after the others. */
  async create(studioId: string, { id, name }: z.output<typeof createPileSchema>): Promise<PileEntity> {
    const last = await this.dataSource.manager.maximum(PileEntity, 'position', { studioId });
    const row = { id, studioId, name, position: (last ?? -1) + 1, sharedWithContributors: false, createdAt: this.now() };
    return (await createOnce(this.dataSource.manager, PileEntity, row, 'pile', (existing) => existing.studioId === studioId)).row;
  }

  async update({ id }: PileEntity, changes: z.output<typeof updatePileSchema>): Promise<PileEntity> {
    if (Object.keys(changes).length > 0) await this.dataSource.manager.update(PileEntity, { id }, changes);
    return this.get(id);
  }

  /** Its prints stay, in no pile. */
  async remove({ id }: PileEntity): Promise<void> {
    await this.dataSource.manager.delete(PileEntity, { id });
  }
}

export const targetOfPile = (pile: PileEntity): Target => ({
  studioId: pile.studioId,
  pileId: pile.id,
  sharedWithContributors: pile.sharedWithContributors,
});
