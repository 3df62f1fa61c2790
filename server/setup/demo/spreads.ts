import type { CommandCall } from '../../../shared/commands/calls';
import { runCommand } from '../../../shared/commands/run-command';
import { placeScheme, suggestSchemes } from '../../../shared/colour/schemes';
import type { PrintId, Side } from '../../../shared/model/ids';
import { inches } from '../../../shared/model/length';
import { newDocument } from '../../../shared/model/new-document';
import { DEFAULT_BINDING, PAGE_FORMATS } from '../../../shared/model/page-format';
import { applyPatch } from '../../../shared/model/patch';
import type { Print } from '../../../shared/model/print';
import type { Content, SpreadDocument } from '../../../shared/model/spread';
import { TRIM_SETTINGS_INCH } from '../../../shared/model/trim-settings';

/** A mat of a demo page: its cells, and what lies on it (a picture file, or anything else). */
interface DemoMat {
  readonly cells: readonly [x: number, y: number, w: number, h: number];
  readonly print?: string;
  readonly content?: Content;
  readonly focal?: boolean;
  /** Mats that share a number are panes of one split print. */
  readonly panes?: number;
}

export interface DemoSpread {
  readonly title: string;
  readonly document: SpreadDocument;
}

const DARK = '#1d4f5c';

const OUT_LEFT: readonly DemoMat[] = [
  { cells: [0, 0, 3, 5], panes: 1, print: 'headland.jpg' },
  { cells: [3, 0, 3, 5], panes: 1 },
  { cells: [6, 0, 3, 5], panes: 1 },
  { cells: [9, 0, 3, 5], panes: 1 },
  { cells: [12, 0, 10, 5], content: { kind: 'lettering', text: 'Out to\nthe light', color: DARK, letterHeight: inches(5 / 8) } },
  { cells: [0, 5, 5, 9], print: 'signal.jpg' },
  { cells: [5, 5, 13, 9], print: 'arrival.jpg', focal: true },
  {
    cells: [18, 5, 4, 9],
    content: {
      kind: 'journaling',
      text: 'Saturday, 13 June. Nora counted every step to the top. Ivo waved at every gate, and every gate waved back.',
      color: '#23272f',
      lineHeight: inches(3 / 8),
    },
  },
  { cells: [0, 14, 6, 8], print: 'stair.jpg' },
  { cells: [6, 14, 6, 8], print: 'window.jpg' },
  { cells: [12, 14, 6, 8], print: 'pim.jpg' },
  { cells: [18, 14, 4, 4], print: 'brick.jpg' },
  { cells: [18, 18, 4, 4], content: { kind: 'paper', pattern: 'stripe', color: DARK, ground: '#f3f0e8' } },
];

const OUT_RIGHT: readonly DemoMat[] = [
  { cells: [0, 0, 8, 8], print: 'nora.jpg' },
  { cells: [8, 0, 6, 8], print: 'thrift.jpg' },
  { cells: [14, 0, 8, 8], print: 'lens.jpg' },
  { cells: [0, 8, 4, 7], panes: 2, print: 'cliff.jpg' },
  { cells: [4, 8, 4, 7], panes: 2 },
  { cells: [8, 8, 4, 7], panes: 2 },
  { cells: [12, 8, 10, 7], print: 'family.jpg' },
  { cells: [0, 15, 6, 7], print: 'driver.jpg' },
  { cells: [6, 15, 9, 7], print: 'station.jpg' },
  { cells: [15, 15, 7, 7], print: 'rope.jpg' },
];

const GRASS_LEFT: readonly DemoMat[] = [
  { cells: [0, 0, 13, 9], print: 'picnic.jpg', focal: true },
  { cells: [13, 0, 9, 5], content: { kind: 'lettering', text: 'On the\ngrass', color: DARK, letterHeight: inches(5 / 8) } },
  { cells: [13, 5, 9, 4] },
  { cells: [0, 9, 8, 8], print: 'rope.jpg' },
  { cells: [8, 9, 6, 8], print: 'thrift.jpg' },
  {
    cells: [14, 9, 8, 13],
    content: { kind: 'journaling', text: 'Sunday. Two apples, three sandwiches and a hand that was not ours.', color: '#fdfcf8', lineHeight: inches(3 / 8) },
  },
  { cells: [0, 17, 7, 5], print: 'ticket.jpg' },
  { cells: [7, 17, 7, 5] },
];

const GRASS_RIGHT: readonly DemoMat[] = [
  { cells: [0, 0, 9, 9], print: 'beach.jpg' },
  { cells: [9, 0, 13, 9], print: 'gulls.jpg' },
  { cells: [0, 9, 7, 13], print: 'pim.jpg' },
  { cells: [7, 9, 8, 6], print: 'seawindow.jpg' },
  { cells: [15, 9, 7, 6] },
  { cells: [7, 15, 15, 7], print: 'cliff.jpg' },
];

/** The demo's three spreads: one finished, one half done with notes to read, one bare. */
export function buildDemoSpreads(printByFile: ReadonlyMap<string, Print>, newId: () => string): DemoSpread[] {
  const prints = new Map<PrintId, Print>([...printByFile.values()].map((print) => [print.id, print]));
  const format = PAGE_FORMATS[0]!;
  const context = { prints, trim: TRIM_SETTINGS_INCH, newId };
  const run = (doc: SpreadDocument, call: CommandCall): SpreadDocument => {
    const patch = runCommand(doc, call, context);
    if (Object.keys(patch).length === 0) throw new Error(`the demo's ${call.id} does nothing: ${JSON.stringify(call.args)}`);
    return applyPatch(doc, patch);
  };
  const idOf = (file: string): PrintId => {
    const print = printByFile.get(file);
    if (!print) throw new Error(`the demo names a picture that it does not have: ${file}`);
    return print.id;
  };
  const layOut = (start: SpreadDocument, page: Side, mats: readonly DemoMat[]): SpreadDocument => {
    const sketch = mats.map(({ cells: [x, y, w, h], focal, panes }) => ({ x, y, w, h, focal, paneGroup: panes }));
    const laid = run(start, { id: 'pages.useSketch', args: { page, mats: sketch, color: DARK } });
    return mats.reduce((doc, { cells: [x, y], print, content }) => {
      const matId = doc.mats.find((mat) => mat.page === page && mat.x === x && mat.y === y)!.id;
      if (content) return run(doc, { id: 'mats.setContent', args: { matId, content } });
      return print ? run(doc, { id: 'prints.place', args: { printId: idOf(print), matId } }) : doc;
    }, laid);
  };
  const withTable = (files: readonly string[]): SpreadDocument =>
    run(newDocument(format, DEFAULT_BINDING, 'both'), { id: 'table.add', args: { printIds: files.map(idOf) } });
  const inScheme = (doc: SpreadDocument, index: number): SpreadDocument => {
    const scheme = suggestSchemes({ doc, prints })[index]!;
    return run(doc, { id: 'scheme.apply', args: placeScheme({ doc, ...context }, scheme) });
  };

  /** The headland's four panes spread apart, so that the lighthouse stands whole in the third. */
  const spreadPanes = (doc: SpreadDocument): SpreadDocument => {
    const headland = doc.panes.find((group) => group.content?.printId === idOf('headland.jpg'))!;
    const apart = run(doc, { id: 'panes.setRun', args: { groupId: headland.id, run: 'apart' } });
    return run(apart, { id: 'window.slide', args: { matId: headland.matIds[0]!, x: inches(1, 1 / 2), y: inches(1 / 4) } });
  };

  const all = [...printByFile.keys()];
  const out = inScheme(spreadPanes(layOut(layOut(withTable(all), 'left', OUT_LEFT), 'right', OUT_RIGHT)), 0);
  const grassPrints = ['picnic.jpg', 'rope.jpg', 'thrift.jpg', 'ticket.jpg', 'beach.jpg', 'gulls.jpg', 'pim.jpg', 'seawindow.jpg', 'cliff.jpg', 'scone.jpg', 'tower.jpg', 'nora.jpg', 'lens.jpg', 'stair.jpg', 'brick.jpg'];
  const grass = layOut(layOut(withTable(grassPrints), 'left', GRASS_LEFT), 'right', GRASS_RIGHT);
  return [
    { title: 'Out to the light', document: out },
    { title: 'On the grass', document: grass },
    { title: 'Home by lamplight', document: newDocument(format, DEFAULT_BINDING, 'both') },
  ];
}
