import type { Print } from '../../shared/model/print';
import type { PileEntity } from '../entities/pile-entity';
import type { PrintEntity } from '../entities/print-entity';
import type { Pile } from '../../shared/contracts/prints';

export const presentPrint = (print: PrintEntity): Print => ({
  id: print.id,
  studioId: print.studioId,
  pileId: print.pileId,
  position: print.position,
  title: print.title,
  paperWidth: print.paperWidth,
  paperHeight: print.paperHeight,
  turns: print.turns,
  copies: print.copies,
  marks: {
    noUp: print.noUp,
    oneOfAKind: print.oneOfAKind,
    borrowedUntil: print.borrowedUntil,
    instantFilm: print.instantFilm,
    digital: print.digital,
  },
  imageWidth: print.imageWidth,
  imageHeight: print.imageHeight,
  paperRect: print.paperRect,
  keepZone: print.keepZone,
  details: print.details,
  faces: print.faces,
  horizon: print.horizon,
  palette: print.palette,
  raster: print.raster,
  revision: print.revision,
});

export const presentPile = (pile: PileEntity): Pile => ({
  id: pile.id,
  studioId: pile.studioId,
  name: pile.name,
  position: pile.position,
  sharedWithContributors: pile.sharedWithContributors,
});
