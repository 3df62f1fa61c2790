import fc from 'fast-check';
import type { CommandCall } from '#shared/commands/calls';
import { gridOf } from '#shared/geometry/grid';
import { cellsOverlap } from '#shared/model/document-faults';
import type { Side } from '#shared/model/ids';
import { inches, millimetres } from '#shared/model/length';
import type { Print } from '#shared/model/print';
import type { Content, Mat, PaneGroup, SpreadDocument } from '#shared/model/spread';
import { buildMat, buildPrint, buildSpread, formatOf, idOf, matIdOf, paneGroupIdOf, printIdOf } from './builders';

/** A box of prints that between them have every mark and several shapes. */
export const PRINTS: readonly Print[] = [
  buildPrint({ id: printIdOf(1), keepZone: { x: 120, y: 80, width: 150, height: 200 } }),
  buildPrint({ id: printIdOf(2), paperWidth: inches(4), paperHeight: inches(6), marks: { noUp: true } }),
  buildPrint({ id: printIdOf(3), paperWidth: inches(3, 1 / 2), paperHeight: inches(4, 1 / 4), marks: { instantFilm: true } }),
  buildPrint({ id: printIdOf(4), marks: { digital: true }, keepZone: { x: 0, y: 0, width: 90, height: 90 } }),
  buildPrint({ id: printIdOf(5), paperWidth: millimetres(89), paperHeight: millimetres(127), marks: { oneOfAKind: true, noUp: true } }),
  buildPrint({ id: printIdOf(6), marks: { digital: true, noUp: true }, turns: 1 }),
];

const hex = fc.constantFrom('#1f4e5f', '#d8c3a5', '#ffffff', '#7a1f2b');
const side = fc.constantFrom<Side>('left', 'right');
const printId = fc.constantFrom(...PRINTS.map((print) => print.id));
const reveal = fc.constantFrom(0, inches(1 / 16), inches(1 / 8), inches(1 / 2), inches(2));

const otherContent = fc.constantFrom<Content>(
  { kind: 'bare' },
  { kind: 'paper', pattern: 'stripe', color: '#7a1f2b', ground: '#ffffff' },
  { kind: 'lettering', text: 'Harbour day', color: '#222222', letterHeight: inches(1) },
  { kind: 'journaling', text: 'Rain until four.', color: '#222222', lineHeight: inches(1 / 4) },
  { kind: 'keepsake', name: 'Ferry ticket', width: inches(2), height: inches(1), thickness: 40, fragile: true, acidic: false },
);

const placement = fc.record({
  printId,
  mode: fc.constant<'window'>('window'),
  x: fc.integer({ min: 0, max: 20_000 }),
  y: fc.integer({ min: 0, max: 20_000 }),
  turn: fc.constant<0>(0),
  scaledWidth: fc.constant(null),
  detailId: fc.constant(null),
});

const cell = fc.integer({ min: 0, max: 23 });
const span = fc.integer({ min: 1, max: 12 });

const rawMat = fc.record({
  page: side,
  x: cell,
  y: cell,
  w: span,
  h: span,
  z: fc.integer({ min: 0, max: 3 }),
  color: hex,
  laidOver: fc.boolean(),
  focal: fc.boolean(),
  inner: fc.option(fc.record({ color: hex, reveal: fc.constant(inches(1 / 16)) }), { nil: null, freq: 4 }),
  content: fc.oneof(otherContent, placement.map((placed): Content => ({ kind: 'print', ...placed }))),
});

/** Faultless spreads of four formats, with up to fourteen mats and sometimes a split print. */
export const spreads: fc.Arbitrary<SpreadDocument> = fc
  .record({
    format: fc.constantFrom('12x12in', '12x12in-bleed', 'a4', '6x8in').map(formatOf),
    raw: fc.array(rawMat, { maxLength: 14 }),
    single: fc.boolean(),
    paneCount: fc.integer({ min: 0, max: 4 }),
    picture: fc.option(placement, { nil: null }),
    run: fc.constantFrom<'behind' | 'apart'>('behind', 'apart'),
  })
  .map(({ format, raw, single, paneCount, picture, run }) => {
    const grid = gridOf(format);
    const mats: Mat[] = [];
    for (const parts of raw) {
      const w = Math.min(parts.w, grid.columns);
      const h = Math.min(parts.h, grid.rows);
      const mat = buildMat({
        ...parts,
        id: matIdOf(mats.length + 1),
        page: single ? 'right' : parts.page,
        w,
        h,
        x: Math.min(parts.x, grid.columns - w),
        y: Math.min(parts.y, grid.rows - h),
        focal: parts.focal && !mats.some((other) => other.focal && other.page === (single ? 'right' : parts.page)),
        inner: w > 1 && h > 1 ? parts.inner : null,
      });
      if (mat.laidOver || !mats.some((other) => !other.laidOver && cellsOverlap(other, mat))) mats.push(mat);
    }
    const paned = mats.filter((mat) => mat.page === 'right').slice(0, paneCount);
    const id = paneGroupIdOf(1);
    const group: PaneGroup = { id, matIds: paned.map((mat) => mat.id), content: picture && { ...picture, run } };
    const panes = paned.length > 1 ? [group] : [];
    return buildSpread({
      format,
      pages: { left: single ? null : { color: '#ffffff' }, right: { color: '#ffffff' } },
      mats: mats.map((mat) => (panes.length > 0 && paned.includes(mat) ? { ...mat, content: { kind: 'pane', groupId: id } } : mat)),
      panes,
      table: PRINTS.slice(0, 3).map((print) => print.id),
    });
  });

const step = fc.integer({ min: -9, max: 9 });
const axis = fc.constantFrom<'horizontal' | 'vertical'>('horizontal', 'vertical');
const length = fc.integer({ min: -30_000, max: 60_000 });

/** Any command, with arguments that name things of `doc` (and now and then nothing that exists). */
export function callsOn(doc: SpreadDocument): fc.Arbitrary<CommandCall> {
  const matId = fc.constantFrom(...doc.mats.map((mat) => mat.id), idOf(404));
  const matIds = doc.mats.length > 0 ? fc.uniqueArray(fc.constantFrom(...doc.mats.map((mat) => mat.id)), { minLength: 1, maxLength: 5 }) : fc.constant([idOf(404)]);
  const groupId = fc.constantFrom(...doc.panes.map((group) => group.id), idOf(404));
  const call = <Id extends CommandCall['id']>(id: Id, args: fc.Arbitrary<Extract<CommandCall, { id: Id }>['args']>): fc.Arbitrary<CommandCall> =>
    args.map((value) => ({ id, args: value }) as CommandCall);
  const sketchMat = fc.record(
    { x: cell, y: cell, w: span, h: span, focal: fc.boolean(), paneGroup: fc.integer({ min: 0, max: 1 }) },
    { requiredKeys: ['x', 'y', 'w', 'h'] },
  );
  const inner = fc.option(fc.record({ color: hex, reveal }), { nil: null });
  return fc.oneof(
    call('prints.place', fc.record({ printId, matId })),
    call('prints.move', fc.record({ fromMatId: matId, toMatId: matId })),
    call('prints.lift', fc.record({ matIds })),
    call('window.slide', fc.record({ matId, x: length, y: length })),
    call('placement.setWhole', fc.record({ matId, whole: fc.boolean() })),
    call('placement.turn', fc.record({ matId, turn: fc.constantFrom<0 | 1 | 2 | 3>(0, 1, 2, 3) })),
    call('placement.scale', fc.record({ matId, scaledWidth: length })),
    call('mats.add', fc.record({ page: side, x: cell, y: cell, w: span, h: span, laidOver: fc.boolean(), content: fc.oneof(otherContent, placement.map((placed): Content => ({ kind: 'print', ...placed }))) })),
    call('mats.delete', fc.record({ matIds })),
    call('mats.duplicate', fc.record({ matId })),
    call('mats.move', fc.record({ matIds, dx: step, dy: step, page: side }, { requiredKeys: ['matIds', 'dx', 'dy'] })),
    call('mats.resize', fc.record({ matId, x: fc.integer({ min: -3, max: 25 }), y: cell, w: span, h: span })),
    call('mats.split', fc.record({ matId, columns: fc.integer({ min: 0, max: 4 }), rows: fc.integer({ min: 1, max: 3 }) })),
    call('mats.merge', fc.record({ matIds })),
    call('mats.mirror', fc.record({ matIds, axis })),
    call('mats.turn', fc.record({ matId })),
    call('mats.setColor', fc.record({ matIds, color: hex })),
    call('mats.setReveal', fc.record({ matIds, reveal: fc.option(reveal, { nil: null }) })),
    call('mats.setInner', fc.record({ matIds, inner })),
    call('mats.setTrueSize', fc.record({ matId, trueSize: fc.option(fc.record({ width: fc.integer({ min: 1, max: 30_000 }), height: fc.integer({ min: 1, max: 30_000 }) }), { nil: null }) })),
    call('mats.setFocal', fc.record({ matId, focal: fc.boolean() })),
    call('mats.setLaidOver', fc.record({ matIds, laidOver: fc.boolean() })),
    call('mats.setContent', fc.record({ matId, content: otherContent })),
    call('panes.group', fc.record({ matIds, printId: fc.option(printId, { nil: null }) })),
    call('panes.ungroup', fc.record({ groupId })),
    call('panes.setRun', fc.record({ groupId, run: fc.constantFrom<'behind' | 'apart'>('behind', 'apart') })),
    call('pages.mirror', fc.record({ page: side, axis })),
    call('pages.swap', fc.constant({})),
    call('pages.setColor', fc.record({ pages: fc.constantFrom<Side[]>(['left'], ['right'], ['left', 'right']), color: hex })),
    call('pages.useSketch', fc.record({ page: side, color: hex, mats: fc.array(sketchMat, { maxLength: 4 }) })),
    call('spread.setReveal', fc.record({ reveal })),
    call('scheme.apply', fc.record({
      scheme: fc.constant({ character: 'echo' as const, colors: Object.fromEntries(['base', 'main', 'second', 'accent'].map((role) => [role, { hex: '#d8c3a5', printIds: [] }])) as never }),
      pageColor: hex,
      matColors: fc.dictionary(matId, hex, { maxKeys: 4 }),
      inners: fc.dictionary(matId, inner, { maxKeys: 3 }),
    })),
    call('table.add', fc.record({ printIds: fc.array(printId, { maxLength: 3 }) })),
    call('table.remove', fc.record({ printIds: fc.array(printId, { maxLength: 3 }) })),
  );
}
