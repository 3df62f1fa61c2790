import type { Hex, MatId, PrintId } from '../model/ids';
import type { Print } from '../model/print';
import type { Mat, Scheme, SchemeColor, SpreadDocument, TrimSettings } from '../model/spread';
import type { CommandArgs } from '../commands/calls';
import { clamp } from '../geometry/clamp';
import { assignCards, type CardRole } from './assign-cards';
import { cardUnits } from './card-units';
import type { Oklch } from './convert';
import { oklchToHex } from './css-color';
import { innersFor } from './thin-inners';
import { photoColors, type PhotoColor } from './photo-colors';

export interface SchemeInput {
  readonly doc: SpreadDocument;
  readonly prints: ReadonlyMap<PrintId, Print>;
}

export interface PlaceInput extends SchemeInput {
  /** No inner mat may take a keep zone's tolerance. */
  readonly trim: TrimSettings;
}

/** What is asked of schemes besides the spread itself. */
export interface SchemeWishes {
  /** Skin may become card; it is left out unless asked. */
  readonly withSkin?: boolean;
}

/** Photo colours with less chroma are neutrals and are kept apart from the rest. */
const NEUTRAL_CHROMA = 0.03;
/** A colour needs this share of what is seen before a mat is cut in it; an accent needs less. */
const MIN_CARD_SHARE = 0.03;
const MIN_ACCENT_SHARE = 0.004;
/** Hues this far apart, in degrees, read as two colours. */
const OTHER_HUE = 40;
/** An accent is small and vivid, so it stands apart from a calm card already at this hue distance. */
const ACCENT_HUE = 30;
/**
 * Skin of photos without marked faces lies about here in OKLCH: both skin patches of the 24-patch colour target do,
 * sand, rope and kraft are yellower. The bounds are our own. Card of it makes faces look pale: common practice.
 */
const SKIN = { hue: [25, 66], chroma: [0.03, 0.125], lightness: [0.4, 0.92] } as const;

/**
 * Card's tones: whatever a photo's rim is, one of the four keeps its distance from it. Main and second are
 * held to either side of a middle tone, the accent to where it is vivid.
 */
const MAIN_TONE = [0.3, 0.46] as const;
const SECOND_TONE = [0.64, 0.8] as const;
const ACCENT_TONE = [0.5, 0.74] as const;
const BASE_TONE = 0.955;
const DARKEST_TONE = 0.17;

/**
 * The three schemes for the photos on a spread: `echo` (what is in them), `quiet` (neutrals that let them
 * lead) and `lift` (echo with one accent across the wheel), in that order. Weighed by the area seen of
 * each photo; from the prints lying ready where none is placed; empty where there are none. Each colour
 * names the prints it comes from. Skin is left out unless asked, and neutrals serve as card only where no colour can.
 * Same input, same schemes.
 */
export function suggestSchemes({ doc, prints }: SchemeInput, { withSkin = false }: SchemeWishes = {}): Scheme[] {
  const seen = photoColors(doc, prints, { withSkin });
  const colors = withSkin ? seen : withoutSkin(seen);
  if (colors.length === 0) return [];
  const echo = echoOf(colors);
  return [echo, quietOf(colors), liftOf(colors, echo)];
}

/**
 * Where a scheme's colours go: base on the pages, and for every mat main, second or accent so that each
 * photo's rim keeps its distance (CIEDE2000 12, see `standsOut`) wherever one of the scheme's colours lets
 * it; a thin inner mat where none of the card colours does. Neighbours differ where they can, and the accent lands
 * on small mats of both pages. Deterministic. A mat's own inner mat stays, recoloured only where it hides
 * the photo; one that the last scheme put there is decided anew.
 */
export function placeScheme({ doc, prints, trim }: PlaceInput, scheme: Scheme): CommandArgs['scheme.apply'] {
  const units = cardUnits(doc, prints, trim, scheme);
  const before = new Map(doc.mats.map((mat) => [mat.id, mat]));
  const { roles } = assignCards(units);
  const matColors: Record<MatId, Hex> = {};
  const inners: Record<MatId, Mat['inner']> = {};
  units.forEach((unit, i) => {
    const role: CardRole = roles[i]!;
    for (const mat of unit.mats) matColors[mat.id] = scheme.colors[role].hex;
    Object.assign(inners, innersFor(unit, role, scheme, before));
  });
  const base = scheme.colors.base.hex;
  return Object.keys(inners).length > 0 ? { scheme, pageColor: base, matColors, inners } : { scheme, pageColor: base, matColors };
}

/** What is not skin; of photos of nothing but skin, its tones without their colour. */
function withoutSkin(colors: readonly PhotoColor[]): readonly PhotoColor[] {
  const others = colors.filter((color) => !isSkin(color));
  if (others.length > 0) return others;
  const calm = ([l, c, h]: Oklch): Oklch => [l, Math.min(c, NEUTRAL_CHROMA / 2), h];
  return colors.map((color) => ({ ...color, oklch: calm(color.oklch), vivid: calm(color.vivid) }));
}

const isSkin = ({ oklch: [l, c, h] }: PhotoColor): boolean => within(h, SKIN.hue) && within(c, SKIN.chroma) && within(l, SKIN.lightness);

function echoOf(colors: readonly PhotoColor[]): Scheme {
  const main = mainOf(colors);
  const second = secondOf(colors, main);
  return { character: 'echo', colors: { base: baseOf(colors, main), main: main.color, second: second.color, accent: accentOf(colors, [main, second]).color } };
}

/** A card colour and the photo colour that it was taken from. */
interface Chosen {
  readonly color: SchemeColor;
  readonly oklch: Oklch;
  readonly from: PhotoColor;
}

function mainOf(colors: readonly PhotoColor[]): Chosen {
  const from = strongest(colors, cardScore(colors, MAIN_TONE)) ?? colors[0]!;
  return choose(from, [hold(from.oklch[0], MAIN_TONE), cardChroma(from), from.oklch[2]]);
}

/** Another hue of the photos where there is one, else the same hue in a lighter tone. */
function secondOf(colors: readonly PhotoColor[], main: Chosen): Chosen {
  const others = colors.filter((color) => color !== main.from);
  const otherHue = others.filter((color) => isColored(color) && hueDistance(color.oklch[2], main.oklch[2]) >= OTHER_HUE);
  const byTone = ({ weight, oklch: [l] }: PhotoColor): number => weight * (0.2 + Math.abs(l - main.oklch[0]));
  const from = strongest(otherHue, cardScore(colors, SECOND_TONE)) ?? strongest(others, byTone) ?? main.from;
  return choose(from, [hold(from.oklch[0], SECOND_TONE), cardChroma(from) * 0.85, from.oklch[2]]);
}

/** The most vivid colour that is neither of the other two; in photos without colour a near-black. */
function accentOf(colors: readonly PhotoColor[], taken: readonly Chosen[]): Chosen {
  const isOther = ({ vivid }: PhotoColor): boolean => taken.every(({ oklch }) => hueDistance(vivid[2], oklch[2]) >= ACCENT_HUE);
  const score = ({ vivid, weight }: PhotoColor): number => (weight >= MIN_ACCENT_SHARE ? vivid[1] * Math.sqrt(Math.sqrt(weight)) : 0);
  const vivid = colors.filter(({ vivid: [, chroma] }) => chroma >= NEUTRAL_CHROMA);
  const from = strongest(vivid.filter(isOther), score) ?? strongest(vivid, score);
  if (!from) {
    const darkest = colors.reduce((a, b) => (b.oklch[0] < a.oklch[0] ? b : a));
    return choose(darkest, [DARKEST_TONE, darkest.oklch[1], darkest.oklch[2]]);
  }
  let lightness = hold(from.vivid[0], ACCENT_TONE);
  // Of a hue that is taken already, only a tone between the two reads as a third colour.
  if (!isOther(from)) lightness = (MAIN_TONE[1] + SECOND_TONE[0]) / 2;
  return choose(from, [lightness, Math.min(0.19, Math.max(from.vivid[1] * 1.15, 0.09)), from.vivid[2]]);
}

/** Nearly white, with a breath of the lightest colour's hue. */
function baseOf(colors: readonly PhotoColor[], main: Chosen): SchemeColor {
  const light = strongest(colors, ({ oklch, weight }) => (oklch[0] > 0.7 ? Math.sqrt(weight) * oklch[0] : 0)) ?? main.from;
  return choose(light, [BASE_TONE, Math.min(light.oklch[1] * 0.4, 0.018), light.oklch[2]]).color;
}

function quietOf(colors: readonly PhotoColor[]): Scheme {
  // The photos' own temperature: their mean hue, weighed by chroma and area.
  const a = colors.reduce((sum, { oklch: [, c, h], weight }) => sum + weight * c * Math.cos(radians(h)), 0);
  const b = colors.reduce((sum, { oklch: [, c, h], weight }) => sum + weight * c * Math.sin(radians(h)), 0);
  const hue = Math.hypot(a, b) < 0.003 ? 80 : (degrees(Math.atan2(b, a)) + 360) % 360;
  const neutral = (lightness: number, chroma: number): SchemeColor => ({ hex: oklchToHex([lightness, chroma, hue]), printIds: [] });
  const main = mainOf(colors);
  const accent = isColored(main.from)
    ? choose(main.from, [0.5, Math.min(main.oklch[1], 0.07), main.oklch[2]]).color
    : neutral(0.54, 0.012);
  return {
    character: 'quiet',
    colors: { base: neutral(0.965, 0.006), main: neutral(0.38, 0.014), second: neutral(0.77, 0.012), accent },
  };
}

/** Where the photos have no hue to stand across from: a warm ochre, which suits black and white. */
const HUE_FOR_GREYS = 70;

function liftOf(colors: readonly PhotoColor[], echo: Scheme): Scheme {
  const main = mainOf(colors);
  const second = secondOf(colors, main);
  const hue = isColored(main.from) ? acrossFrom(main, second) : HUE_FOR_GREYS;
  return { character: 'lift', colors: { ...echo.colors, accent: { hex: oklchToHex([0.66, 0.15, hue]), printIds: [] } } };
}

/** Across the wheel, and where the second colour stands there already, the nearest place to either side of it. */
const ACROSS = [180, 150, 210, 120, 240] as const;
const CLEAR_OF_SECOND = 40;

function acrossFrom(main: Chosen, second: Chosen): number {
  const hues = ACROSS.map((turn) => (main.oklch[2] + turn) % 360);
  const isClear = (hue: number): boolean => second.oklch[1] < NEUTRAL_CHROMA || hueDistance(hue, second.oklch[2]) >= CLEAR_OF_SECOND;
  return hues.find(isClear) ?? hues[0]!;
}

const isColored = ({ oklch: [, chroma] }: PhotoColor): boolean => chroma >= NEUTRAL_CHROMA;

/** Hues this near count as one family, so that light and dark of one colour speak together; wider, and sand would speak for brick. */
const SAME_FAMILY = 20;
/** A colour that runs through so many prints ties the spread together; one print's own colour counts less. */
const TYING_PRINTS = 4;
/** A colour whose tone must be moved far to become card is not the colour any more. */
const TONE_SHIFT_COST = 2;
/**
 * Light oranges and yellows turn to mud when they are darkened to a main card's tone; sea, leaf and brick do not, and
 * wood or moss that is dark by itself is no more than drab. Our own judgement.
 */
const MUDDY = { hue: [50, 120], darkened: 0.12, drab: 0.6 } as const;

/**
 * How well a photo colour serves for large mats of a tone: its family is seen a lot
 * and in several prints, it is coloured, near that tone, and not mud.
 */
function cardScore(colors: readonly PhotoColor[], tone: readonly [number, number]): (color: PhotoColor) => number {
  return (color) => {
    const [l, c, h] = color.oklch;
    if (!isColored(color) || color.weight < MIN_CARD_SHARE) return 0;
    const family = colors.filter((other) => isColored(other) && hueDistance(other.oklch[2], h) < SAME_FAMILY);
    const seen = family.reduce((sum, { weight }) => sum + weight, color.weight);
    const sources = new Set([...family, color].flatMap(({ printIds }) => printIds)).size;
    const ties = (1 + Math.min(sources, TYING_PRINTS)) / (1 + TYING_PRINTS);
    const shift = Math.abs(l - hold(l, tone));
    const isMuddy = tone === MAIN_TONE && within(h, MUDDY.hue);
    const mud = isMuddy ? (l > tone[1] ? MUDDY.darkened : MUDDY.drab) : 1;
    const suits = Math.max(0.25, 1 - shift * TONE_SHIFT_COST) * mud;
    return seen * ties * (0.35 + Math.min(c, 0.12) / 0.12) * suits;
  };
}

/** The first with the largest score above 0. */
function strongest(colors: readonly PhotoColor[], score: (color: PhotoColor) => number): PhotoColor | null {
  let best: PhotoColor | null = null;
  let bestScore = 0;
  for (const color of colors) {
    const value = score(color);
    if (value > bestScore) {
      bestScore = value;
      best = color;
    }
  }
  return best;
}

/** Card is calmer than light on a screen: chroma is held where a sheet of cardstock is found. */
const cardChroma = ({ oklch: [, chroma] }: PhotoColor): number => Math.min(chroma, 0.12);
const choose = (from: PhotoColor, oklch: Oklch): Chosen => ({ color: { hex: oklchToHex(oklch), printIds: from.printIds }, oklch, from });
const hold = (v: number, [least, most]: readonly [number, number]): number => clamp(v, least, most);
const within = (v: number, [least, most]: readonly [number, number]): boolean => v >= least && v <= most;
const radians = (degree: number): number => (degree * Math.PI) / 180;
const degrees = (radian: number): number => (radian * 180) / Math.PI;
const hueDistance = (a: number, b: number): number => Math.abs(((a - b + 540) % 360) - 180);
