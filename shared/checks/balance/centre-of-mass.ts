import type { Size } from '../../model/rect';

export interface Mass {
  readonly x: number;
  readonly y: number;
  readonly mass: number;
}

export interface Point {
  readonly x: number;
  readonly y: number;
}

/** Where masses balance; null where there is no mass. */
export function centreOfMass(masses: readonly Mass[]): Point | null {
  let total = 0;
  let x = 0;
  let y = 0;
  for (const m of masses) {
    total += m.mass;
    x += m.mass * m.x;
    y += m.mass * m.y;
  }
  return total > 0 ? { x: x / total, y: y / total } : null;
}

/**
 * Deviation of the centre of mass (DCM): how far a centre lies from the middle of its frame, as a
 * percentage; 0 in the middle, 100 in the middle of an edge, up to 141 in a corner.
 *
 * R. Hübner, M. G. Fillinger (2016), "Comparison of objective measures for predicting perceptual balance and
 * visual aesthetic preference", Frontiers in Psychology 7:335, in the continuous form: the published program
 * rounds the centre to whole pixels, by which a perfectly centred shape in a small picture scores up to 18.
 */
export function deviationOfCentre(centre: Point, frame: Size): number {
  return (100 * Math.hypot(centre.x / frame.width - 0.5, centre.y / frame.height - 0.5)) / 0.5;
}
