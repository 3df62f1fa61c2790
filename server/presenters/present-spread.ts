import type { SpreadState } from '../../shared/contracts/albums';
import type { CheckSettings } from '../../shared/contracts/check-settings';
import type { Actor } from '../../shared/model/people';
import type { Print } from '../../shared/model/print';
import type { SpreadDocument, TrimSettings } from '../../shared/model/spread';
import { can } from '../../shared/permissions';
import type { SpreadEntity } from '../entities/spread-entity';
import { readDocument, targetOfSpread } from '../services/spread-service';
import type { SpreadSetting } from '../services/spread-setting';
import { presentCheckSetting } from './present-check-setting';
import { presentPrint } from './present-print';

interface SpreadAnswer {
  readonly id: string;
  readonly albumId: string;
  readonly studioId: string;
  readonly title: string;
  readonly position: number;
  readonly state: SpreadState;
  readonly revision: number;
  readonly updatedAt: string;
  readonly binned: boolean;
  readonly document: SpreadDocument;
}

interface SpreadDetailAnswer extends SpreadAnswer {
  readonly albumTitle: string;
  readonly studioName: string;
  readonly unit: 'in' | 'mm';
  readonly trim: TrimSettings;
  readonly prints: readonly Print[];
  readonly usedElsewhere: Readonly<Record<string, number>>;
  readonly checks: CheckSettings;
  readonly may: { readonly edit: boolean; readonly comment: boolean; readonly export: boolean };
}

export const presentSpread = (spread: SpreadEntity): SpreadAnswer => ({
  id: spread.id,
  albumId: spread.albumId,
  studioId: spread.studioId,
  title: spread.title,
  position: spread.position,
  state: spread.state,
  revision: spread.revision,
  updatedAt: spread.updatedAt.toISOString(),
  binned: spread.binnedAt !== null,
  document: readDocument(spread),
});

export function presentSpreadDetail(spread: SpreadEntity, setting: SpreadSetting, actor: Actor): SpreadDetailAnswer {
  const target = targetOfSpread(spread);
  return {
    ...presentSpread(spread),
    albumTitle: setting.album.title,
    studioName: setting.studio.name,
    unit: setting.studio.unit,
    trim: { tolerance: setting.studio.tolerance, finestMark: setting.studio.finestMark },
    prints: setting.prints.map(presentPrint),
    // Other spreads are no business of somebody who holds a link to this one.
    usedElsewhere: can(actor, 'album:see', target) === 'allow' ? setting.usedElsewhere : {},
    checks: { studio: setting.checks.studio.map(presentCheckSetting), spread: setting.checks.spread.map(presentCheckSetting) },
    may: {
      edit: can(actor, 'spread:edit', target) === 'allow',
      comment: can(actor, 'spread:comment', target) === 'allow',
      export: can(actor, 'export:make', target) === 'allow',
    },
  };
}
