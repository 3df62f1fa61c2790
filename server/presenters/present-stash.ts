import type { StashReservation, StashSheet, StashSide } from '../../shared/model/stash';
import type { StashReservationEntity } from '../entities/stash-reservation-entity';
import type { StashSideEntity } from '../entities/stash-side-entity';
import type { CountedSheet } from '../services/stash-rows';

export function presentStashSheet({ sheet, reserved }: CountedSheet): StashSheet {
  const side = (face: StashSideEntity['face']): StashSide | null => {
    const found = sheet.sides?.find((candidate) => candidate.face === face);
    return found ? { hex: found.hex, source: found.source, uncertainty: found.uncertainty, pattern: found.pattern, palette: found.palette } : null;
  };
  const [front, back] = [side('front'), side('back')];
  if (!front) throw new Error(`stash sheet ${sheet.id} was read without its front`);
  return {
    id: sheet.id,
    studioId: sheet.studioId,
    name: sheet.name,
    maker: sheet.maker,
    texture: sheet.texture,
    place: sheet.place,
    width: sheet.width,
    height: sheet.height,
    quantity: sheet.quantity,
    reserved,
    lowAt: sheet.lowAt,
    price: sheet.price,
    sides: back ? [front, back] : [front],
    revision: sheet.revision,
  };
}

export const presentReservation = ({ sheetId, spreadId, sheets }: StashReservationEntity): StashReservation => ({ sheetId, spreadId, sheets });
