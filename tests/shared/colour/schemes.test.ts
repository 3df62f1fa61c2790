import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ciede2000 } from '#shared/colour/ciede2000';
import { hexToLab, hexToOklab, hexToOklch, rgbToHex } from '#shared/colour/convert';
import { rimContrast } from '#shared/colour/rim';
import { placeScheme, suggestSchemes } from '#shared/colour/schemes';
import { visibleShares } from '#shared/colour/shares';
import { placedPhotos } from '#shared/geometry/placed-photos';
import { inches } from '#shared/model/length';
import type { Print } from '#shared/model/print';
import type { Mat, Scheme, SchemeRole, SpreadDocument } from '#shared/model/spread';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import {
  buildMat,
  buildPanes,
  buildPrint,
  buildRaster,
  buildSpread,
  matIdOf,
  printContent,
  printIdOf,
  printsById,
} from '../../support/builders';

const ROLES: readonly SchemeRole[] = ['base', 'main', 'second', 'accent'];

/** A print whose picture is bands of these colours from left to right. */
const bands = (n: number, ...hexes: string[]): Print =>
  buildPrint({ id: printIdOf(n), raster: buildRaster(64, 43, (x) => hexToOklab(hexes[Math.floor((x * hexes.length) / 64)]!)) });

/** A row of mats with one print each, on both pages in turn. */
function spreadOf(prints: readonly Print[], parts: Partial<SpreadDocument> = {}): SpreadDocument {
  return buildSpread({
    mats: prints.map((print, i) =>
      buildMat({
        id: matIdOf(i),
        page: i % 2 ? 'right' : 'left',
        x: (Math.floor(i / 2) % 5) * 4,
        y: Math.floor(i / 10) * 4,
        z: i,
        content: printContent(print),
      }),
    ),
    ...parts,
  });
}

/** The same with every print mounted whole, so that all of it is seen. */
function wholeSpread(prints: readonly Print[]): SpreadDocument {
  return buildSpread({
    mats: prints.map((print, i) => buildMat({ id: matIdOf(i), page: i % 2 ? 'right' : 'left', z: i, w: 13, h: 9, content: printContent(print, { mode: 'whole' }) })),
  });
}

const deltaE = (a: string, b: string): number => ciede2000(hexToLab(a), hexToLab(b));
const inputOf = (doc: SpreadDocument, prints: readonly Print[]) => ({ doc, prints: printsById(prints) });

const harbour = bands(1, '#1f4e5f', '#1f4e5f', '#2d6f86', '#e8e2d4');
const heather = bands(2, '#6b4a78', '#6b4a78', '#8c6f96', '#eceae4');
const buoy = bands(3, '#1f4e5f', '#2d6f86', '#2d6f86', '#2d6f86', '#2d6f86', '#2d6f86', '#e04f26', '#e8e2d4');
const seaside = [harbour, heather, buoy];

describe('suggestSchemes', () => {
  it('offers echo, quiet and lift for the photos on the spread', () => {
    const [echo, quiet, lift] = suggestSchemes(inputOf(wholeSpread(seaside), seaside));
    expect([echo!.character, quiet!.character, lift!.character]).toEqual(['echo', 'quiet', 'lift']);
    // Echo: the sea is the main card, the buoy's orange the accent, each with its prints.
    expect(echo!.colors.main.printIds[0]).toBe(buoy.id);
    expect(echo!.colors.second.printIds).toEqual([heather.id]);
    expect(echo!.colors.accent.printIds).toEqual([buoy.id]);
    expect(Math.abs(hexToOklch(echo!.colors.accent.hex)[2] - hexToOklch('#e04f26')[2])).toBeLessThan(8);
    // Quiet: neutrals that belong to no print, and one muted colour.
    for (const role of ['base', 'main', 'second'] as const) {
      expect(hexToOklch(quiet!.colors[role].hex)[1]).toBeLessThan(0.025);
      expect(quiet!.colors[role].printIds).toEqual([]);
    }
    // Lift: echo, with an accent across the wheel that is in no print.
    expect(lift!.colors.main).toEqual(echo!.colors.main);
    const turned = hexToOklch(lift!.colors.accent.hex)[2] - hexToOklch(echo!.colors.main.hex)[2];
    expect(Math.abs(Math.abs(((turned + 540) % 360) - 180) - 180)).toBeLessThan(12);
    expect(lift!.colors.accent.printIds).toEqual([]);
  });

  it('weighs what the windows show, not what was trimmed away', () => {
    const half = bands(7, '#1f4e5f', '#b03a2e');
    const window = (x: number) =>
      buildSpread({ mats: [buildMat({ w: 5, h: 5, content: printContent(half, { x }) })] });
    const hueOf = (x: number): number => hexToOklch(suggestSchemes(inputOf(window(x), [half]))[0]!.colors.main.hex)[2];
    expect(hueOf(0)).toBeCloseTo(hexToOklch('#1f4e5f')[2], -1);
    expect(hueOf(inches(3, 1 / 2))).toBeCloseTo(hexToOklch('#b03a2e')[2], -1);
  });

  it('reads the prints lying ready while none is placed, and has nothing to say without prints', () => {
    const ready = buildSpread({ table: seaside.map(({ id }) => id) });
    expect(suggestSchemes(inputOf(ready, seaside))).toHaveLength(3);
    expect(suggestSchemes(inputOf(buildSpread(), seaside))).toEqual([]);
  });

  it('gives the same schemes for the same input', () => {
    const input = inputOf(wholeSpread(seaside), seaside);
    expect(suggestSchemes(input)).toEqual(suggestSchemes(inputOf(wholeSpread(seaside), seaside)));
  });

  // "Light skin" and "dark skin" of the 24-patch colour target, in its published sRGB values.
  it.each(['#c29682', '#735244'])('leaves skin out of the mats’ colours unless asked: %s', (skin) => {
    const portrait = bands(8, skin, skin, skin, '#2f5d50');
    const input = inputOf(wholeSpread([portrait]), [portrait]);
    const near = (hex: string): boolean => hexToOklch(hex)[1] > 0.03 && Math.abs(hexToOklch(hex)[2] - hexToOklch(skin)[2]) < 15;
    for (const { colors } of suggestSchemes(input).filter(({ character }) => character !== 'lift')) {
      for (const role of ['main', 'second', 'accent'] as const) expect(near(colors[role].hex)).toBe(false);
    }
    const asked = suggestSchemes(input, { withSkin: true })[0]!.colors;
    expect([asked.main, asked.second, asked.accent].some(({ hex }) => near(hex))).toBe(true);
  });

  it('leaves out all skin within a marked face, and keeps the same colour elsewhere', () => {
    // Yellower than the bounds for unmarked photos, as rope and sand are.
    const sandy = '#b5895a';
    const portrait = { ...bands(8, sandy, '#2f5d50'), faces: [{ rect: { x: 0, y: 0, width: 320, height: 400 }, facing: 'ahead' as const }] };
    const sources = (print: Print): boolean => suggestSchemes(inputOf(wholeSpread([print]), [print]))[0]!.colors.second.printIds.length > 0
      && Math.abs(hexToOklch(suggestSchemes(inputOf(wholeSpread([print]), [print]))[0]!.colors.second.hex)[2] - hexToOklch(sandy)[2]) < 10;
    expect(sources({ ...portrait, faces: [] })).toBe(true);
    expect(sources(portrait)).toBe(false);
  });

  it('keeps neutrals out of the mats’ colours while there is a colour', () => {
    const grey = bands(9, '#777777', '#8a8a8a', '#999999', '#aaaaaa', '#bbbbbb', '#444444', '#333333', '#1f4e5f');
    const [echo] = suggestSchemes(inputOf(wholeSpread([grey]), [grey]));
    expect(hexToOklch(echo!.colors.main.hex)[1]).toBeGreaterThan(0.03);
  });

  it('has schemes for photos of nothing but skin', () => {
    const closeUp = bands(8, '#c29682', '#d0a590');
    for (const { colors } of suggestSchemes(inputOf(wholeSpread([closeUp]), [closeUp]))) {
      for (const role of ['base', 'main', 'second'] as const) expect(hexToOklch(colors[role].hex)[1]).toBeLessThan(0.03);
    }
  });

  it('sets lift’s accent apart from the second colour as well', () => {
    const seaAndBrick = bands(4, '#1f4e5f', '#1f4e5f', '#1f4e5f', '#b35a3c', '#b35a3c', '#e8e2d4');
    const lift = suggestSchemes(inputOf(wholeSpread([seaAndBrick]), [seaAndBrick]))[2]!;
    const [second, accent] = [lift.colors.second, lift.colors.accent].map(({ hex }) => hexToOklch(hex)[2]) as [number, number];
    expect(Math.abs(((second - accent + 540) % 360) - 180)).toBeGreaterThan(25);
  });

  it.each([
    ['black and white photos', [bands(1, '#101010', '#808080', '#f0f0f0'), bands(2, '#303030', '#c0c0c0')]],
    ['one photo of one colour', [bands(1, '#446688')]],
    ['photos all alike', [1, 2, 3, 4].map((n) => bands(n, '#446688', '#8fa3b5'))],
    ['nothing but white', [bands(1, '#ffffff')]],
    ['nothing but black', [bands(1, '#000000')]],
  ])('finds four colours that can be told apart in %s', (_, prints) => {
    const schemes = suggestSchemes(inputOf(wholeSpread(prints), prints));
    for (const { colors } of schemes) {
      const hexes = ROLES.map((role) => colors[role].hex);
      hexes.forEach((hex, i) => {
        expect(hex).toMatch(/^#[0-9a-f]{6}$/);
        hexes.slice(i + 1).forEach((other) => expect(deltaE(hex, other)).toBeGreaterThan(8));
      });
      expect(hexToOklch(colors.base.hex)[0]).toBeGreaterThan(0.9);
    }
  });
});

const color = fc.tuple(fc.nat(255), fc.nat(255), fc.nat(255)).map(([r, g, b]) => rgbToHex(r, g, b));
const somePrints = fc
  .array(fc.array(color, { minLength: 1, maxLength: 4 }), { minLength: 1, maxLength: 24 })
  .map((lists) => lists.map((hexes, i) => bands(i + 1, ...hexes)));

describe('placeScheme', () => {
  const applied = (doc: SpreadDocument, prints: readonly Print[], scheme: Scheme, trim = TRIM_SETTINGS_INCH) =>
    placeScheme({ ...inputOf(doc, prints), trim }, scheme);

  it('never leaves a rim closer than CIEDE2000 12 to its mat where another of the scheme’s colours would do', () => {
    fc.assert(
      fc.property(somePrints, (prints) => {
        const doc = spreadOf(prints);
        for (const scheme of suggestSchemes(inputOf(doc, prints))) {
          const { matColors, inners = {} } = applied(doc, prints, scheme);
          for (const photo of placedPhotos(doc, (id) => prints.find((print) => print.id === id))) {
            const print = prints.find(({ id }) => id === photo.printId)!;
            const closest = (hex: string): number => rimContrast(print, photo.window, hex).medianDeltaE;
            const round = inners[photo.matId]?.color ?? matColors[photo.matId]!;
            const sinks = (hex: string): boolean => closest(hex) < 12 || rimContrast(print, photo.window, hex).closeShare >= 1 / 3;
            if (sinks(round)) expect(ROLES.every((role) => sinks(scheme.colors[role].hex))).toBe(true);
          }
        }
      }),
      { numRuns: 40 },
    );
  }, 20_000);

  it('puts a thin light inner mat where the card colours all hide the photo, and takes it away with the next scheme', () => {
    const scheme: Scheme = {
      character: 'echo',
      colors: {
        base: { hex: '#f6f2e8', printIds: [] },
        main: { hex: '#1f4e5f', printIds: [] },
        second: { hex: '#22505f', printIds: [] },
        accent: { hex: '#1d4d60', printIds: [] },
      },
    };
    const night = bands(1, '#1f4e5f');
    const doc = spreadOf([night]);
    const { inners } = applied(doc, [night], scheme);
    expect(inners).toEqual({ [matIdOf(0)]: { color: '#f6f2e8', reveal: inches(1 / 16) } });

    const matted = { ...doc, scheme, mats: doc.mats.map((mat): Mat => ({ ...mat, inner: inners![mat.id]! })) };
    const light = { ...scheme, colors: { ...scheme.colors, main: { hex: '#e7c71f', printIds: [] } } };
    expect(applied(matted, [night], light)).toMatchObject({ matColors: { [matIdOf(0)]: '#e7c71f' }, inners: { [matIdOf(0)]: null } });
    expect(applied(matted, [night], scheme).inners).toBeUndefined();
  });

  it('leaves a person’s own inner mat as it is where it does not hide the photo', () => {
    const mats = [buildMat({ inner: { color: '#ffffff', reveal: inches(1 / 8) }, content: printContent(harbour) })];
    const doc = buildSpread({ mats });
    const [echo] = suggestSchemes(inputOf(doc, seaside));
    expect(applied(doc, seaside, echo!).inners).toBeUndefined();
  });

  it('puts no inner mat where it would cut into the keep zone: the page colour serves as card', () => {
    const scheme: Scheme = {
      character: 'echo',
      colors: { base: { hex: '#f6f2e8', printIds: [] }, main: { hex: '#1f4e5f', printIds: [] }, second: { hex: '#22505f', printIds: [] }, accent: { hex: '#1d4d60', printIds: [] } },
    };
    // The window shows 1 5/8 in of the paper from its corner, at 100 px an inch.
    const tight = { ...bands(1, '#1f4e5f'), keepZone: { x: 10, y: 10, width: 145, height: 60 } };
    const roomy = { ...tight, keepZone: { x: 10, y: 10, width: 100, height: 60 } };
    expect(applied(spreadOf([tight]), [tight], scheme)).toMatchObject({ matColors: { [matIdOf(0)]: '#f6f2e8' } });
    expect(applied(spreadOf([tight]), [tight], scheme).inners).toBeUndefined();
    expect(applied(spreadOf([roomy]), [roomy], scheme).inners).toBeDefined();
    // With 1/2 in to spare the same keep zone is as tight.
    expect(applied(spreadOf([roomy]), [roomy], scheme, { ...TRIM_SETTINGS_INCH, tolerance: inches(1 / 2) }).inners).toBeUndefined();
  });

  it('asks nothing of card that does not show, and puts no inner mat on it', () => {
    const white = bands(1, '#ffffff');
    const doc = buildSpread({ mats: [buildMat({ id: matIdOf(0), reveal: 0, content: printContent(white) })] });
    const hidden: Scheme = {
      character: 'quiet',
      colors: { base: { hex: '#fefefe', printIds: [] }, main: { hex: '#fdfdfd', printIds: [] }, second: { hex: '#fcfcfc', printIds: [] }, accent: { hex: '#fbfbfb', printIds: [] } },
    };
    expect(applied(doc, [white], hidden)).toEqual({ scheme: hidden, pageColor: '#fefefe', matColors: { [matIdOf(0)]: '#fdfdfd' } });
  });

  it('reads the same part of a scaled digital photo as is printed', () => {
    const half = { ...bands(1, '#1f4e5f', '#f4f2ee'), marks: { ...harbour.marks, digital: true } };
    // At half its size, 3 × 2 in: the window's 1 5/8 in show all of the dark half and little of the pale one.
    const doc = buildSpread({ mats: [buildMat({ id: matIdOf(0), content: printContent(half, { scaledWidth: inches(3) }) })] });
    const [echo] = suggestSchemes(inputOf(doc, [half]));
    expect(echo!.colors.main.printIds).toEqual([half.id]);
    const unscaled = buildSpread({ mats: [buildMat({ id: matIdOf(0), content: printContent(half) })] });
    expect(suggestSchemes(inputOf(unscaled, [half]))[0]!.colors.base).not.toEqual(echo!.colors.base);
  });

  it('lands the accent on at least three of the smaller mats, on both pages', () => {
    // Pale all round, so that every card colour would do.
    const inside = ['#1f4e5f', '#2d6f86', '#8a4f7d', '#d9a441'].map(hexToOklab);
    const pale = hexToOklab('#f4f2ee');
    const raster = buildRaster(64, 43, (x, y) => (x < 6 || x > 57 || y < 6 || y > 36 ? pale : inside[Math.floor(x / 16)]!));
    const prints = Array.from({ length: 6 }, (_, i) => buildPrint({ id: printIdOf(i + 1), raster }));
    const page = (side: 'left' | 'right', from: number): Mat[] => [
      buildMat({ id: matIdOf(from), page: side, x: 0, y: 0, w: 12, h: 12, z: from, focal: true, content: printContent(prints[from % 6]!, { mode: 'whole' }) }),
      buildMat({ id: matIdOf(from + 1), page: side, x: 12, y: 0, w: 10, h: 6, z: from + 1, content: printContent(prints[(from + 1) % 6]!, { mode: 'whole' }) }),
      buildMat({ id: matIdOf(from + 2), page: side, x: 12, y: 6, w: 10, h: 6, z: from + 2, content: printContent(prints[(from + 2) % 6]!, { mode: 'whole' }) }),
      buildMat({ id: matIdOf(from + 3), page: side, x: 0, y: 12, w: 5, h: 4, z: from + 3 }),
      buildMat({ id: matIdOf(from + 4), page: side, x: 17, y: 18, w: 5, h: 4, z: from + 4 }),
    ];
    const doc = buildSpread({ mats: [...page('left', 0), ...page('right', 10)] });
    const [echo] = suggestSchemes(inputOf(doc, prints));
    const { matColors } = applied(doc, prints, echo!);
    const accented = doc.mats.filter((mat) => matColors[mat.id] === echo!.colors.accent.hex);
    expect(accented.length).toBeGreaterThanOrEqual(3);
    expect(new Set(accented.map((mat) => mat.page)).size).toBe(2);
    // No larger than the middle one of all mats.
    expect(Math.max(...accented.map((mat) => mat.w * mat.h))).toBeLessThanOrEqual(60);
    expect(matColors[matIdOf(0)]).toBe(echo!.colors.main.hex);
    // Of three that touch each other, two at least differ.
    expect(new Set([0, 1, 2].map((n) => matColors[matIdOf(n)])).size).toBeGreaterThan(1);
  });

  it('gives all panes of a split print one colour', () => {
    const mats = [0, 1, 2, 3].map((i) => buildMat({ id: matIdOf(i), x: (i % 2) * 4, y: Math.floor(i / 2) * 4, z: i }));
    const { group, mats: panes } = buildPanes(harbour, mats);
    const doc = buildSpread({ mats: panes, panes: [group] });
    const [echo] = suggestSchemes(inputOf(doc, seaside));
    expect(new Set(Object.values(applied(doc, seaside, echo!).matColors)).size).toBe(1);
  });

  it('keeps dark lettering off dark card', () => {
    const title = buildMat({ x: 0, y: 12, w: 12, h: 4, content: { kind: 'lettering', text: 'High water', color: '#1b2a33', letterHeight: 2000 } });
    const doc = spreadOf(seaside, { mats: [...spreadOf(seaside).mats, title] });
    for (const scheme of suggestSchemes(inputOf(doc, seaside))) {
      const { matColors } = applied(doc, seaside, scheme);
      expect(hexToLab(matColors[title.id]!)[0] - hexToLab('#1b2a33')[0]).toBeGreaterThan(35);
    }
  });

  it('colours every mat, and nothing else, with colours of the scheme', () => {
    fc.assert(
      fc.property(somePrints, (prints) => {
        const doc = spreadOf(prints);
        const [echo] = suggestSchemes(inputOf(doc, prints));
        const { matColors, pageColor } = applied(doc, prints, echo!);
        expect(Object.keys(matColors).sort()).toEqual(doc.mats.map(({ id }) => id).sort());
        const known = new Set(ROLES.map((role) => echo!.colors[role].hex));
        expect(Object.values(matColors).every((hex) => known.has(hex))).toBe(true);
        expect(pageColor).toBe(echo!.colors.base.hex);
        expect(applied(doc, prints, echo!)).toEqual(applied(doc, prints, echo!));
      }),
      { numRuns: 40 },
    );
  }, 20_000);

  it('has nothing to colour on a bare spread', () => {
    const ready = buildSpread({ table: seaside.map(({ id }) => id) });
    const [echo] = suggestSchemes(inputOf(ready, seaside));
    expect(applied(ready, seaside, echo!).matColors).toEqual({});
  });
});

describe('visibleShares', () => {
  const scheme: Scheme = {
    character: 'echo',
    colors: {
      base: { hex: '#f6f2e8', printIds: [] },
      main: { hex: '#1f4e5f', printIds: [] },
      second: { hex: '#8b9986', printIds: [] },
      accent: { hex: '#d67e2c', printIds: [] },
    },
  };
  const page = { color: '#f6f2e8' };

  it('counts card that shows: page, mat border and inner mat, not what lies under a photo', () => {
    const print = buildPrint();
    const mat = buildMat({ color: '#1f4e5f', w: 8, h: 8, reveal: inches(1 / 4), inner: { color: '#8b9986', reveal: inches(1 / 8) }, content: printContent(print) });
    const doc = buildSpread({ pages: { left: page, right: null }, mats: [mat] });
    // 4 in of grid less the gap: a mat of 3 7/8, an inner mat of 3 3/8, a photo of 3 1/8 in.
    const shown = { base: 144 - 3.875 ** 2, main: 3.875 ** 2 - 3.375 ** 2, second: 3.375 ** 2 - 3.125 ** 2 };
    const total = shown.base + shown.main + shown.second;
    const shares = visibleShares(doc, scheme, printsById([print]));
    expect(shares.base).toBeCloseTo(shown.base / total, 12);
    expect(shares.main).toBeCloseTo(shown.main / total, 12);
    expect(shares.second).toBeCloseTo(shown.second / total, 12);
    expect(shares.accent).toBe(0);
  });

  it('counts what is laid over once, for the card on top', () => {
    const under = buildMat({ color: '#1f4e5f', w: 8, h: 8 });
    const over = buildMat({ color: '#d67e2c', x: 6, y: 2, w: 4, h: 4, z: 1, laidOver: true });
    const doc = buildSpread({ pages: { left: page, right: page }, mats: [under, over] });
    const shares = visibleShares(doc, scheme);
    const side = 1.875;
    // The strip lies 7/8 in over the mat beneath it, on its whole height.
    const hidden = 0.875 * side;
    expect(shares.accent).toBeCloseTo(side ** 2 / 288, 12);
    expect(shares.main).toBeCloseTo((3.875 ** 2 - hidden) / 288, 12);
    expect(shares.base + shares.main + shares.second + shares.accent).toBeCloseTo(1, 12);
  });

  it('is nothing on a spread without pages', () => {
    expect(visibleShares(buildSpread({ pages: { left: null, right: null } }), scheme)).toEqual({ base: 0, main: 0, second: 0, accent: 0 });
  });
});
