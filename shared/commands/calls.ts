import type { DetailId, Hex, MatId, PaneGroupId, PrintId, Side, Turns } from '../model/ids';
import type { Content, Mat, Scheme } from '../model/spread';

/** A sketch's mats, without ids: what `pages.useSketch` lays out. */
export interface SketchMat {
  readonly x: number;
  readonly y: number;
  readonly w: number;
  readonly h: number;
  readonly focal?: boolean;
  /** Mats with the same number are the panes of one split print. */
  readonly paneGroup?: number;
}

/** Every editor command with its arguments: what a button, a key, a gesture or a note's remedy asks for. */
export interface CommandArgs {
  /** Puts a print on a mat, its window centred on the keep zone or on one of its details; what lay there goes back to the table. */
  'prints.place': { printId: PrintId; matId: MatId; detailId?: DetailId };
  /** Moves what one mat carries to another; the two swap. */
  'prints.move': { fromMatId: MatId; toMatId: MatId };
  /** Takes the print off a mat, back to the table. */
  'prints.lift': { matIds: readonly MatId[] };
  /** Window's corner on the paper; snapped to the finest mark and kept on the paper. Works for a pane's whole group. */
  'window.slide': { matId: MatId; x: number; y: number };
  'placement.setWhole': { matId: MatId; whole: boolean };
  'placement.turn': { matId: MatId; turn: Turns };
  'placement.scale': { matId: MatId; scaledWidth: number };
  'mats.add': { page: Side; x: number; y: number; w: number; h: number; color?: Hex; laidOver?: boolean; content?: Content };
  'mats.delete': { matIds: readonly MatId[] };
  /** A copy at the nearest free place of the same page, or of the other one. */
  'mats.duplicate': { matId: MatId };
  'mats.move': { matIds: readonly MatId[]; dx: number; dy: number; page?: Side };
  'mats.resize': { matId: MatId; x: number; y: number; w: number; h: number };
  'mats.split': { matId: MatId; columns: number; rows: number };
  /** Merges mats whose cells together make a rectangle. */
  'mats.merge': { matIds: readonly MatId[] };
  /** Mirrors the places (never the pictures) within the mats' own bounding box. */
  'mats.mirror': { matIds: readonly MatId[]; axis: 'horizontal' | 'vertical' };
  /** Turns one mat's width and height over, about its top-left corner. */
  'mats.turn': { matId: MatId };
  'mats.setColor': { matIds: readonly MatId[]; color: Hex };
  'mats.setReveal': { matIds: readonly MatId[]; reveal: number | null };
  'mats.setInner': { matIds: readonly MatId[]; inner: Mat['inner'] };
  'mats.setTrueSize': { matId: MatId; trueSize: Mat['trueSize'] };
  /** A page has at most one declared focal; declaring another moves the mark. */
  'mats.setFocal': { matId: MatId; focal: boolean };
  'mats.setLaidOver': { matIds: readonly MatId[]; laidOver: boolean };
  /** Anything but a print or a pane. */
  'mats.setContent': { matId: MatId; content: Content };
  'panes.group': { matIds: readonly MatId[]; printId: PrintId | null };
  'panes.ungroup': { groupId: PaneGroupId };
  'panes.setRun': { groupId: PaneGroupId; run: 'behind' | 'apart' };
  'pages.mirror': { page: Side; axis: 'horizontal' | 'vertical' };
  'pages.swap': Record<string, never>;
  'pages.setColor': { pages: readonly Side[]; color: Hex };
  /** Replaces a page's mats with a sketch's; prints on it go back to the table. */
  'pages.useSketch': { page: Side; mats: readonly SketchMat[]; color: Hex };
  'spread.setReveal': { reveal: number };
  'scheme.apply': { scheme: Scheme; pageColor: Hex; matColors: Readonly<Record<MatId, Hex>>; inners?: Readonly<Record<MatId, Mat['inner']>> };
  'table.add': { printIds: readonly PrintId[] };
  'table.remove': { printIds: readonly PrintId[] };
}

export type CommandId = keyof CommandArgs;

/** A command with its arguments, as plain data: what a remedy is. */
export type CommandCall = { [Id in CommandId]: { readonly id: Id; readonly args: CommandArgs[Id] } }[CommandId];
