import { describe, expect, it } from 'vitest';
import { photoSinks } from '#shared/checks/photo-sinks';
import { runChecks } from '#shared/checks/run-checks';
import { inches } from '#shared/model/length';
import type { Print } from '#shared/model/print';
import type { Mat, Placement } from '#shared/model/spread';
import { buildMat, buildPanes, buildPrint, buildRaster, buildSpread, buildView, printContent, type OklabPixel } from '../../support/builders';

const DARK: OklabPixel = [0.3, 0, 0];
const LIGHT: OklabPixel = [0.95, 0, 0];
/** OKLab lightness about 0.3 and 0.95. */
const DARK_CARD = '#2e2e2e';
const LIGHT_CARD = '#ededed';

const printOf = (pixel: OklabPixel | ((x: number, y: number) => OklabPixel)): Print => buildPrint({ raster: buildRaster(60, 40, pixel) });
/** The left part of the picture, so many of 60 columns, is dark and the rest light. */
const darkUpTo = (columns: number): Print => printOf((x) => (x < columns ? DARK : LIGHT));

function viewOf(print: Print, mat: Partial<Mat>, placement: Partial<Placement> = {}) {
  const placed = buildMat({ w: 12, h: 8, content: printContent(print, placement), ...mat });
  return buildView({ doc: buildSpread({ mats: [placed] }), prints: [print] });
}
const run = (...args: Parameters<typeof viewOf>) => photoSinks.run(viewOf(...args));

describe('photo-sinks', () => {
  it('notes a dark photo on dark card, and how much of its rim', () => {
    expect(run(printOf(DARK), { color: DARK_CARD })).toMatchObject([{ messageId: 'photo-sinks', data: { share: 100, matColor: DARK_CARD } }]);
  });

  it('is content with a dark photo on light card', () => {
    expect(run(printOf(DARK), { color: LIGHT_CARD })).toEqual([]);
  });

  it('draws the line at a third of the rim', () => {
    // The photo shows nearly all of the print: of its rim of 18 × 12 parts, 12 columns of 60 are dark for 0.33.
    const share = (columns: number): number => Number(run(darkUpTo(columns), { color: DARK_CARD }, { x: inches(1 / 16) })[0]?.data && 1);
    expect(share(4)).toBeNaN();
    expect(share(26)).toBe(1);
    expect(photoSinks.run(viewOf(darkUpTo(26), { color: DARK_CARD }), { share: 0.9 })).toEqual([]);
  });

  it('holds the photo against the inner mat where one shows', () => {
    const inner = { color: LIGHT_CARD, reveal: inches(1 / 16) };
    expect(run(printOf(DARK), { color: DARK_CARD, inner })).toEqual([]);
    expect(run(printOf(LIGHT), { color: DARK_CARD, inner })).toMatchObject([{ data: { matColor: LIGHT_CARD } }]);
    expect(run(printOf(LIGHT), { color: DARK_CARD, inner: { ...inner, reveal: 0 } })).toEqual([]);
  });

  it('has nothing to say where no card shows', () => {
    expect(run(printOf(DARK), { color: DARK_CARD, reveal: 0 })).toEqual([]);
  });

  it('speaks once of a split print, of the panes that sink', () => {
    const print = darkUpTo(20);
    const { group, mats } = buildPanes(print, [buildMat({ x: 0, color: DARK_CARD }), buildMat({ x: 8, color: DARK_CARD })], { run: 'behind' });
    const view = buildView({ doc: buildSpread({ mats, panes: [group] }), prints: [print] });
    expect(photoSinks.run(view)).toMatchObject([{ matIds: [mats[0]!.id] }]);
  });

  it('first offers a thin light inner mat, then other card of the spread', () => {
    const [note] = runChecks(viewOf(printOf(DARK), { color: DARK_CARD }));
    expect(note?.remedy).toMatchObject({ messageId: 'light-inner-mat', call: { id: 'mats.setInner', args: { inner: { color: '#ffffff', reveal: inches(1 / 16) } } } });
    // No light inner mat parts a light photo from light card; the other mat's dark card does.
    const print = printOf(LIGHT);
    const mats = [buildMat({ w: 12, h: 8, color: LIGHT_CARD, content: printContent(print) }), buildMat({ x: 12, color: DARK_CARD })];
    const [light] = runChecks(buildView({ doc: buildSpread({ mats }), prints: [print] }));
    expect(light?.remedy).toMatchObject({ messageId: 'other-color', call: { id: 'mats.setColor', args: { color: DARK_CARD } } });
  });

  it('reads the rim anew when the window slides under panes whose mats stay the same', () => {
    const print = darkUpTo(20);
    const { group, mats } = buildPanes(print, [buildMat({ x: 0, color: DARK_CARD }), buildMat({ x: 4, color: DARK_CARD })]);
    const sunkAt = (x: number): number => {
      const slid = { ...group, content: { ...group.content!, x } };
      return photoSinks.run(buildView({ doc: buildSpread({ mats, panes: [slid] }), prints: [print] }))[0]?.matIds.length ?? 0;
    };
    // Dark is the paper up to 2 in: the first pane's 1 5/8, until the window starts beyond.
    expect([sunkAt(0), sunkAt(inches(2.25)), sunkAt(0)]).toEqual([1, 0, 1]);
  });

  it('forgets a rim when the same mat gets another reveal, inner card or print', () => {
    const mat = buildMat({ w: 12, h: 8, color: DARK_CARD, content: printContent('00000001-0000-4000-8000-00000000abcd') });
    const sinks = (pixel: OklabPixel, reveal: number): boolean => {
      const print = { ...printOf(pixel), id: '00000001-0000-4000-8000-00000000abcd' };
      return photoSinks.run(buildView({ doc: buildSpread({ mats: [mat], reveal }), prints: [print] })).length > 0;
    };
    expect([sinks(DARK, 508), sinks(LIGHT, 508), sinks(DARK, 508), sinks(DARK, 0)]).toEqual([true, false, true, false]);
  });
});
