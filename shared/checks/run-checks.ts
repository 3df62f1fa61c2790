import { matRect } from '../geometry/grid';
import type { Side } from '../model/ids';
import { areFilled } from './filled-pages';
import type { Check, Finding, Note, Severity, SpreadView } from './check';
import { CHECK_IDS, type CheckId } from './check-ids';
import { CHECKS } from './registry';
import { safeRemedy, type SetCheck } from './safe-remedy';

/** What a studio or a spread sets for its checks. */
export interface CheckSettings {
  readonly muted?: ReadonlySet<CheckId>;
  readonly thresholds?: Readonly<Partial<Record<CheckId, Readonly<Record<string, number>>>>>;
}

const SEVERITY_ORDER: Readonly<Record<Severity, number>> = { stop: 0, fix: 1, consider: 2 };

/**
 * All that the checks have to say about a spread: stops first, then fixes, then what to consider; within
 * one severity by the place of the first mat (left page before right, then from top to bottom, then from left
 * to right; a note about no mat before all others). At most one note per cause: a finding falls out where a
 * check that it yields to speaks of one of the same mats. Each remedy has been tried and makes no new stop.
 */
export function runChecks(view: SpreadView, settings: CheckSettings = NO_SETTINGS): Note[] {
  const { checks, stopChecks } = checksFor(settings);
  const found = new Map<CheckId, readonly Finding[]>();
  for (const [check, set] of checks) {
    const isSilent = (check.needsFilledPages && !areFilled(view)) || isContradicted(check, view);
    found.set(check.id, isSilent ? [] : check.run(view, set));
  }
  return checks
    .flatMap(([check]) => {
      const covered = new Set(check.yieldsTo?.flatMap((id) => found.get(id)?.flatMap((finding) => finding.matIds) ?? []));
      return found
        .get(check.id)!
        .filter((finding) => !finding.matIds.some((id) => covered.has(id)))
        .map((finding) => ({ note: noteOf(view, stopChecks, check, finding), place: placeOf(view, finding) }));
    })
    .sort((a, b) => compareNotes(a, b))
    .map(({ note }) => note);
}

const isContradicted = ({ offUnder }: Check, { doc }: SpreadView): boolean => doc.scheme !== null && (offUnder?.includes(doc.scheme.character) ?? false);

const NO_SETTINGS: CheckSettings = {};

interface SetChecks {
  readonly checks: readonly SetCheck[];
  readonly stopChecks: readonly SetCheck[];
}
const known = new WeakMap<CheckSettings, SetChecks>();

/** A muted stop still counts when a remedy is tried: nobody wants a cure that spoils something. */
function checksFor(settings: CheckSettings): SetChecks {
  let set = known.get(settings);
  if (!set) {
    const all = CHECK_IDS.map((id): SetCheck => [CHECKS[id], settings.thresholds?.[id]]);
    set = { checks: all.filter(([check]) => !settings.muted?.has(check.id)), stopChecks: all.filter(([check]) => check.severity === 'stop') };
    known.set(settings, set);
  }
  return set;
}

function noteOf(view: SpreadView, stopChecks: readonly SetCheck[], check: Check, finding: Finding): Note {
  return {
    key: `${check.id}/${finding.messageId}/${finding.matIds.join(',')}`,
    checkId: check.id,
    messageId: finding.messageId,
    severity: check.severity,
    matIds: finding.matIds,
    page: pageOf(view, finding),
    data: finding.data,
    remedy: safeRemedy(view, stopChecks, check, finding),
  };
}

function pageOf({ doc, matById }: SpreadView, finding: Finding): Side {
  const mat = finding.matIds.length > 0 ? matById.get(finding.matIds[0]!) : undefined;
  return finding.page ?? mat?.page ?? (doc.pages.left ? 'left' : 'right');
}

interface Place {
  readonly x: number;
  readonly y: number;
}

function placeOf({ doc, matById }: SpreadView, finding: Finding): Place {
  const mat = finding.matIds.length > 0 ? matById.get(finding.matIds[0]!) : undefined;
  return mat ? matRect(doc.format, mat) : { x: -1, y: -1 };
}

interface PlacedNote {
  readonly note: Note;
  readonly place: Place;
}

const compareNotes = (a: PlacedNote, b: PlacedNote): number =>
  SEVERITY_ORDER[a.note.severity] - SEVERITY_ORDER[b.note.severity] ||
  Number(a.note.page === 'right') - Number(b.note.page === 'right') ||
  a.place.y - b.place.y ||
  a.place.x - b.place.x ||
  CHECK_IDS.indexOf(a.note.checkId) - CHECK_IDS.indexOf(b.note.checkId) ||
  (a.note.key < b.note.key ? -1 : 1);
