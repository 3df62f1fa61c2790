import type { CommandCall, CommandId } from '../commands/calls';
import { runCommand } from '../commands/run-command';
import type { MatId, PrintId } from '../model/ids';
import { applyPatch } from '../model/patch';
import type { Print } from '../model/print';
import type { Mat, PaneGroup } from '../model/spread';
import type { Check, Finding, Remedy, SpreadView } from './check';
import { viewSpread } from './view-spread';

/** Commands that change only what no stop check reads. */
const NEVER_STOPS: ReadonlySet<CommandId> = new Set(['mats.setColor', 'mats.setFocal', 'pages.setColor']);

/** A check with the thresholds that are set for it. */
export type SetCheck = readonly [check: Check, set: Readonly<Record<string, number>> | undefined];

/**
 * The first remedy whose command does something, makes no stop that was not there before and, for the note
 * of a stop check, ends that stop. Null where there is none.
 *
 * Every stop check judges the pieces of one print together and apart from all others, so the command is tried
 * on the part of the spread that it concerns: its mats, and those that carry the same prints. That the rest
 * leaves room for it is the remedy's own care. A property test compares this with the whole spread.
 *
 * @param stopChecks - the same array for the same settings, so that verdicts can be remembered.
 */
export function safeRemedy(view: SpreadView, stopChecks: readonly SetCheck[], check: Check, finding: Finding): Remedy | null {
  const remedies = finding.remedies?.() ?? [];
  return remedies.find(({ call }) => NEVER_STOPS.has(call.id) || isSafe(view, stopChecks, call, check, finding)) ?? null;
}

/** What a verdict rests on, besides the call: equal parts give equal verdicts. */
interface Part {
  readonly mats: readonly Mat[];
  readonly panes: readonly PaneGroup[];
  readonly prints: readonly (Print | undefined)[];
}

interface Verdict {
  readonly part: Part;
  readonly view: SpreadView;
  readonly stopChecks: readonly SetCheck[];
  readonly isSafe: boolean;
}

// By the part's first mat: its object stays the same from edit to edit unless the mat itself changed.
const verdicts = new WeakMap<Mat, Map<string, Verdict>>();
const REMEMBERED = 64;

function isSafe(view: SpreadView, stopChecks: readonly SetCheck[], call: CommandCall, check: Check, finding: Finding): boolean {
  const part = partFor(view, call);
  const first = part.mats[0];
  if (!first) return false;
  const key = `${stopKey(check, finding)} ${JSON.stringify(call)}`;
  let known = verdicts.get(first);
  if (!known) verdicts.set(first, (known = new Map<string, Verdict>()));
  const last = known.get(key);
  if (last && last.stopChecks === stopChecks && restsOnTheSame(last, part, view)) return last.isSafe;
  const verdict = { part, view, stopChecks, isSafe: tryOut(view, stopChecks, part, call, check, finding) };
  if (known.size >= REMEMBERED) known.clear();
  known.set(key, verdict);
  return verdict.isSafe;
}

const sameItems = (a: readonly unknown[], b: readonly unknown[]): boolean => a.length === b.length && a.every((item, i) => item === b[i]);

const restsOnTheSame = (last: Verdict, part: Part, view: SpreadView): boolean =>
  sameItems(last.part.mats, part.mats) &&
  sameItems(last.part.panes, part.panes) &&
  sameItems(last.part.prints, part.prints) &&
  last.view.doc.format === view.doc.format &&
  last.view.doc.reveal === view.doc.reveal &&
  last.view.doc.pages.left === view.doc.pages.left &&
  last.view.doc.pages.right === view.doc.pages.right &&
  last.view.trim === view.trim &&
  last.view.usedElsewhere === view.usedElsewhere;

function tryOut(view: SpreadView, stopChecks: readonly SetCheck[], { mats, panes }: Part, call: CommandCall, check: Check, finding: Finding): boolean {
  let made = 0;
  const newId = (): string => `00000000-0000-4000-8000-${(made += 1).toString(16).padStart(12, '0')}`;
  // Neither table nor scheme decides a verdict, and commands write the whole document out to weigh it.
  const doc = { ...view.doc, mats, panes, table: [], scheme: null };
  const patch = runCommand(doc, call, { prints: view.prints, trim: view.trim, newId });
  if (Object.keys(patch).length === 0) return false;
  const after = stopsOf(viewSpread({ ...view, doc: applyPatch(doc, patch) }), stopChecks);
  if (check.severity === 'stop' && after.has(stopKey(check, finding))) return false;
  if (after.size === 0) return true;
  const before = stopsOf(viewSpread({ ...view, doc }), stopChecks);
  return [...after].every((key) => before.has(key));
}

/** Which stop it is, whatever its present wording. */
const stopKey = (check: Check, finding: Finding): string => `${check.id} ${[...finding.matIds].sort().join(' ')}`;

/** The stops that these checks find in a spread. */
export function stopsOf(view: SpreadView, stopChecks: readonly SetCheck[]): Set<string> {
  return new Set(stopChecks.flatMap(([check, set]) => check.run(view, set).map((finding) => stopKey(check, finding))));
}

/** The mats that a command concerns, with their groups and prints; all of them for a command that names none. */
function partFor(view: SpreadView, call: CommandCall): Part {
  const { prints: printIds, mats: ids } = concerned(view, call);
  const { doc, prints } = view;
  if (ids.size === 0) return { mats: doc.mats, panes: doc.panes, prints: [...prints.values()] };
  const mats = doc.mats.filter((mat) => ids.has(mat.id));
  const panes = doc.panes.filter((group) => group.matIds.some((id) => ids.has(id)));
  return { mats, panes, prints: [...printIds].map((id) => prints.get(id)) };
}

function concerned(view: SpreadView, { args }: CommandCall): { readonly mats: ReadonlySet<MatId>; readonly prints: ReadonlySet<PrintId> } {
  const { groups, carriers } = usesOf(view);
  const named: MatId[] = [];
  if ('matId' in args) named.push(args.matId);
  if ('matIds' in args) named.push(...args.matIds);
  if ('fromMatId' in args) named.push(args.fromMatId, args.toMatId);
  if ('groupId' in args) named.push(...(groups.get(args.groupId)?.matIds ?? []));
  if (named.length === 0) return { mats: new Set(), prints: new Set() };

  const prints = new Set<PrintId>('printId' in args && args.printId !== null ? [args.printId] : []);
  const mats = new Set(named);
  for (const id of named) {
    const content = view.matById.get(id)?.content;
    const group = content?.kind === 'pane' ? groups.get(content.groupId) : undefined;
    // A pane is one thing with its group, even without a print.
    group?.matIds.forEach((member) => mats.add(member));
    const print = content?.kind === 'print' ? content.printId : group?.content?.printId;
    if (print !== undefined) prints.add(print);
  }
  for (const print of prints) carriers.get(print)?.forEach((id) => mats.add(id));
  return { mats, prints };
}

interface Uses {
  readonly groups: ReadonlyMap<string, PaneGroup>;
  readonly carriers: ReadonlyMap<PrintId, readonly MatId[]>;
}
const knownUses = new WeakMap<SpreadView, Uses>();

function usesOf(view: SpreadView): Uses {
  const known = knownUses.get(view);
  if (known) return known;
  const carriers = new Map<PrintId, MatId[]>();
  for (const { printId, matId } of view.photos) {
    const others = carriers.get(printId);
    if (others) others.push(matId);
    else carriers.set(printId, [matId]);
  }
  const uses = { groups: new Map(view.doc.panes.map((group) => [group.id, group])), carriers };
  knownUses.set(view, uses);
  return uses;
}
