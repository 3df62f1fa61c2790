import type { Face, Horizon, PrintMarks, PxRect } from '../../../shared/model/print';

/**
 * The demo's prints: our own drawn snapshots of an invented day out on a narrow-gauge railway to a
 * lighthouse. Rectangles are in pixels of the picture file; keep zones hold the subject with a little room.
 */
export interface DemoPrint {
  readonly file: string;
  readonly title: string;
  readonly widthIn: number;
  readonly heightIn: number;
  readonly pile: DemoPile;
  readonly keepZone: PxRect;
  readonly faces?: readonly Face[];
  readonly horizon?: Horizon;
  readonly marks?: Partial<PrintMarks>;
  readonly copies?: number;
  /** Only where it is not the centre crop: instant film with its white frame. */
  readonly paperRect?: PxRect;
}

export const DEMO_PILES = ['The line', 'The light', 'The beach', 'Us', 'From a relative'] as const;
export type DemoPile = (typeof DEMO_PILES)[number];
/** The pile that contributors may add to. */
export const SHARED_PILE: DemoPile = 'From a relative';

const box = (x1: number, y1: number, x2: number, y2: number): PxRect => ({ x: x1, y: y1, width: x2 - x1, height: y2 - y1 });
const level = (y: number): Horizon => ({ x1: 0, y1: y, x2: 1499, y2: y });
const ahead = (x1: number, y1: number, x2: number, y2: number): Face => ({ rect: box(x1, y1, x2, y2), facing: 'ahead' });

export const DEMO_PRINTS: readonly DemoPrint[] = [
  { file: 'headland.jpg', title: 'Headland and line', widthIn: 6, heightIn: 4, pile: 'The light', keepZone: box(1035, 165, 1190, 440), horizon: level(470) },
  { file: 'arrival.jpg', title: 'The train comes in', widthIn: 6, heightIn: 4, pile: 'The line', keepZone: box(35, 300, 1290, 990) },
  { file: 'tower.jpg', title: 'Skerrow Light', widthIn: 5, heightIn: 7, pile: 'The light', keepZone: box(215, 150, 640, 1040), marks: { oneOfAKind: true } },
  { file: 'nora.jpg', title: 'Nora in the wind', widthIn: 4, heightIn: 4, pile: 'Us', keepZone: box(150, 235, 880, 900), faces: [ahead(255, 400, 745, 875)], copies: 2 },
  {
    file: 'window.jpg',
    title: 'Gran and Ivo, third class',
    widthIn: 4,
    heightIn: 6,
    pile: 'The line',
    keepZone: box(195, 320, 810, 930),
    faces: [ahead(215, 400, 490, 690), ahead(480, 575, 715, 800)],
  },
  { file: 'picnic.jpg', title: 'Lunch on the grass', widthIn: 6, heightIn: 4, pile: 'The beach', keepZone: box(265, 165, 1190, 870), marks: { noUp: true } },
  { file: 'rope.jpg', title: 'Rope on the quay', widthIn: 4, heightIn: 4, pile: 'The beach', keepZone: box(360, 360, 640, 640), marks: { noUp: true }, copies: 2 },
  { file: 'ticket.jpg', title: 'Day return', widthIn: 3.5, heightIn: 5, pile: 'The line', keepZone: box(200, 380, 890, 860) },
  { file: 'pim.jpg', title: 'Pim', widthIn: 3.5, heightIn: 5, pile: 'The beach', keepZone: box(245, 390, 880, 1130), copies: 2 },
  { file: 'thrift.jpg', title: 'Thrift', widthIn: 4, heightIn: 6, pile: 'The beach', keepZone: box(330, 530, 700, 930), copies: 2 },
  { file: 'cliff.jpg', title: 'The stack', widthIn: 6, heightIn: 4, pile: 'The light', keepZone: box(540, 410, 880, 930), horizon: level(372), copies: 2 },
  { file: 'station.jpg', title: 'Skerrow Quay', widthIn: 6, heightIn: 4, pile: 'The line', keepZone: box(315, 200, 1230, 860) },
  { file: 'signal.jpg', title: 'Signal at dusk', widthIn: 3.5, heightIn: 5, pile: 'The line', keepZone: box(470, 110, 890, 490) },
  { file: 'gulls.jpg', title: 'Three gulls', widthIn: 6, heightIn: 4, pile: 'From a relative', keepZone: box(110, 460, 1460, 830), horizon: level(478) },
  { file: 'brick.jpg', title: 'Shed number 4', widthIn: 4, heightIn: 4, pile: 'The line', keepZone: box(375, 390, 620, 735), copies: 2 },
  {
    file: 'family.jpg',
    title: 'All of us at the wall',
    widthIn: 6,
    heightIn: 4,
    pile: 'Us',
    keepZone: box(325, 275, 1305, 985),
    faces: [ahead(375, 290, 580, 540), ahead(645, 345, 825, 545), ahead(880, 385, 1090, 560), ahead(505, 570, 715, 755), ahead(760, 580, 975, 745)],
  },
  { file: 'driver.jpg', title: 'The driver', widthIn: 4, heightIn: 6, pile: 'The line', keepZone: box(165, 340, 690, 770), faces: [ahead(345, 420, 640, 730)] },
  {
    file: 'beach.jpg',
    title: 'Kite on the sand',
    widthIn: 6,
    heightIn: 4,
    pile: 'The beach',
    keepZone: box(285, 60, 970, 850),
    faces: [ahead(535, 420, 645, 545), ahead(790, 455, 890, 550)],
    horizon: level(400),
  },
  { file: 'lens.jpg', title: 'The lens', widthIn: 4, heightIn: 4, pile: 'The light', keepZone: box(150, 150, 850, 850), marks: { noUp: true }, copies: 2 },
  { file: 'stair.jpg', title: '112 steps', widthIn: 4, heightIn: 6, pile: 'The light', keepZone: box(370, 540, 680, 880), marks: { noUp: true }, copies: 2 },
  { file: 'seawindow.jpg', title: 'Home again', widthIn: 6, heightIn: 4, pile: 'The line', keepZone: box(570, 310, 1460, 960), horizon: level(487) },
  {
    file: 'scone.jpg',
    title: 'Two scones',
    widthIn: 3.5,
    heightIn: 4.25,
    pile: 'The beach',
    keepZone: box(95, 225, 760, 890),
    marks: { instantFilm: true },
    // The picture is 3.1 in square, 0.2 in from the left and top edges of its white frame.
    paperRect: { x: -65, y: -65, width: 1129, height: 1371 },
  },
];
