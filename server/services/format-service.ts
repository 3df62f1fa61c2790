import type { DataSource } from 'typeorm';
import { MAX_STEPS } from '../../shared/contracts/document';
import { gridOf } from '../../shared/geometry/grid';
import { AppError } from '../../shared/errors';
import { PAGE_FORMATS, type PageFormat } from '../../shared/model/page-format';
import { PageFormatEntity } from '../entities/page-format-entity';
import { isDuplicateKey } from './database-errors';
import { invalidField } from './invalid-field';

/** Edge to edge, the outer mats end with the page. */
const fillsPage = ({ width, height, step, minMargin }: PageFormat): boolean => minMargin === 0 && width % step === 0 && height % step === 0;

export class FormatService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly now: () => Date,
  ) {}

  /** The shipped formats, then the studio's own, oldest first. */
  async list(studioId: string): Promise<PageFormat[]> {
    const own = await this.dataSource.manager.find(PageFormatEntity, { where: { studioId }, order: { createdAt: 'ASC', id: 'ASC' } });
    return [...PAGE_FORMATS, ...own.map(({ format }) => format)];
  }

  async find(studioId: string, id: string): Promise<PageFormat | null> {
    return (await this.list(studioId)).find((format) => format.id === id) ?? null;
  }

  /**
   * @throws AppError `invalid-input` for a format whose grid holds no step or more than a mat can be placed on, or
   *   whose edge-to-edge grid does not reach the page's edges, `already-exists` for an id that is taken by another format.
   */
  async create(studioId: string, format: PageFormat): Promise<PageFormat> {
    const grid = gridOf(format);
    if (grid.columns < 1 || grid.rows < 1) throw invalidField('step', 'not one whole step fits between the margins');
    if (Math.max(grid.columns, grid.rows) > MAX_STEPS) throw invalidField('step', `a page has at most ${MAX_STEPS} steps along a side`);
    if (format.edge === 'bleed' && !fillsPage(format)) throw invalidField('edge', 'edge to edge needs whole steps over all of the page and no least margin');
    if (format.gap >= format.step) throw invalidField('gap', 'the gap must be smaller than a step');
    const taken = new AppError('already-exists', { what: 'page format', id: format.id });
    if (PAGE_FORMATS.some(({ id }) => id === format.id)) throw taken;
    try {
      await this.dataSource.manager.insert(PageFormatEntity, { studioId, id: format.id, format, createdAt: this.now() });
    } catch (error) {
      if (!isDuplicateKey(error)) throw error;
      const existing = await this.find(studioId, format.id);
      if (JSON.stringify(existing) !== JSON.stringify(format)) throw taken;
    }
    return format;
  }
}
