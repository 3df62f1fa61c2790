import type { FieldFault } from '../contracts/field-faults';
import type { UpdatePrint } from '../contracts/prints';
import { contains, intersection } from '../geometry/rects';
import { automaticPaperRect, hasAutomaticPaperRect, hasPaperShape, sameShape, turnedSize } from '../geometry/paper';
import type { Print, PxRect } from './print';

/** What a person sets on a print; the pile, the bin and the revision are the server's to check. */
export type PrintChanges = Omit<UpdatePrint, 'baseRevision' | 'binned'>;

/**
 * The print after a person's changes.
 *
 * The keep zone, details, faces and horizon stay where they are on the picture, whatever else changes. The paper
 * rectangle follows a new paper size as the centre crop; one that was nudged by hand stays while the paper keeps its
 * shape, since another shape would stretch the picture. A turn that changes width and height over turns the paper with the picture, unless a size is given.
 */
export function changePrint(print: Print, changes: PrintChanges): Print {
  const { marks, turns = print.turns, paperWidth, paperHeight, ...rest } = changes;
  const turnsOver = turns % 2 !== print.turns % 2 && paperWidth === undefined && paperHeight === undefined;
  const paper = turnedSize({ width: paperWidth ?? print.paperWidth, height: paperHeight ?? print.paperHeight }, turnsOver ? 1 : 0);
  const next: Print = {
    ...print,
    ...withoutAbsent(rest),
    turns,
    paperWidth: paper.width,
    paperHeight: paper.height,
    marks: { ...print.marks, ...withoutAbsent(marks ?? {}) },
  };
  const staysNudged = !hasAutomaticPaperRect(print) && sameShape(print, next);
  return changes.paperRect || staysNudged ? next : { ...next, paperRect: automaticPaperRect(next) };
}

/**
 * What does not fit in the changed values, by field. Values that were not touched are not judged: a corrected
 * paper may leave an older keep zone partly outside, which the checks then speak of.
 *
 * @param next - the print after the changes.
 */
export function printFaults(next: Print, changes: PrintChanges): FieldFault[] {
  const image: PxRect = { x: 0, y: 0, width: next.imageWidth, height: next.imageHeight };
  const shown = intersection(image, next.paperRect);
  const faults: FieldFault[] = [];
  if (changes.paperRect && (!shown || !isNear(image, next.paperRect))) {
    faults.push({ path: 'paperRect', message: 'the paper must show some of the picture, with at most one more picture of border on each side' });
  }
  if (changes.paperRect && !hasPaperShape(next)) {
    faults.push({ path: 'paperRect', message: 'must have the proportions of the paper, or the picture would be stretched' });
  }
  const holdIn = (allowed: PxRect | null, rect: PxRect, path: string, where: string): void => {
    if (!allowed || !contains(allowed, rect)) faults.push({ path, message: `must lie inside ${where}` });
  };
  if (changes.keepZone) holdIn(shown, changes.keepZone, 'keepZone', 'the part of the picture that the paper shows');
  changes.details?.forEach((detail, i) => holdIn(shown, detail.rect, `details.${i}.rect`, 'the part of the picture that the paper shows'));
  changes.faces?.forEach((face, i) => holdIn(image, face.rect, `faces.${i}.rect`, 'the picture'));
  if (changes.details && new Set(changes.details.map(({ id }) => id)).size < changes.details.length) {
    faults.push({ path: 'details', message: 'two details have the same id' });
  }
  if (changes.horizon) faults.push(...horizonFaults(changes.horizon, image));
  return faults;
}

const isNear = (image: PxRect, rect: PxRect): boolean =>
  contains({ x: -image.width, y: -image.height, width: 3 * image.width, height: 3 * image.height }, rect);

function horizonFaults({ x1, y1, x2, y2 }: NonNullable<PrintChanges['horizon']>, image: PxRect): FieldFault[] {
  const isInside = (x: number, y: number): boolean => x >= 0 && y >= 0 && x <= image.width && y <= image.height;
  if (!isInside(x1, y1) || !isInside(x2, y2)) return [{ path: 'horizon', message: 'must lie inside the picture' }];
  return x1 === x2 && y1 === y2 ? [{ path: 'horizon', message: 'needs two different ends' }] : [];
}

function withoutAbsent<T extends object>(values: T): Partial<T> {
  return Object.fromEntries(Object.entries(values).filter(([, value]) => value !== undefined)) as Partial<T>;
}
