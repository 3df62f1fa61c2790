import type { CommandCall } from '#shared/commands/calls';
import type { CommandContext } from '#shared/commands/command';
import { runCommand, whyNot } from '#shared/commands/run-command';
import { placedPhotos, type PlacedPhoto } from '#shared/geometry/placed-photos';
import type { MatId } from '#shared/model/ids';
import { applyPatch } from '#shared/model/patch';
import type { Print } from '#shared/model/print';
import type { Mat, SpreadDocument, TrimSettings } from '#shared/model/spread';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { idOf, printsById } from './builders';

/** Runs commands on a spread with these prints, with ids that are the same in every run. */
export function commandsWith(prints: readonly Print[] = [], trim: TrimSettings = TRIM_SETTINGS_INCH) {
  let ids = 0;
  const context: CommandContext = { prints: printsById(prints), trim, newId: () => idOf((ids += 1), 8) };
  return {
    /** The document after the calls, one after the other. */
    after: (doc: SpreadDocument, ...calls: CommandCall[]): SpreadDocument => calls.reduce((next, call) => applyPatch(next, runCommand(next, call, context)), doc),
    whyNot: (doc: SpreadDocument, call: CommandCall) => whyNot(doc, call, context),
    /** What the mat shows of its print. @throws where it shows none. */
    photoOn: (doc: SpreadDocument, matId: MatId): PlacedPhoto => {
      const photo = placedPhotos(doc, (id) => context.prints.get(id)).find((placed) => placed.matId === matId);
      if (!photo) throw new Error(`mat ${matId} shows no print`);
      return photo;
    },
  };
}

/** @throws where the mat is not there. */
export function matIn(doc: SpreadDocument, matId: MatId): Mat {
  const mat = doc.mats.find(({ id }) => id === matId);
  if (!mat) throw new Error(`no mat ${matId}`);
  return mat;
}

export const placeCall = (printId: string, matId: MatId): CommandCall => ({ id: 'prints.place', args: { printId, matId } });
