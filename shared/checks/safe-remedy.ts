import type { CommandCall, CommandId } from '../commands/calls';
import { runCommand } from '../commands/run-command';
import type { MatId, PrintId } from '../model/ids';
import { applyPatch } from '../model/patch';
import type { SpreadDocument } from '../model/spread';
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
 */
export function safeRemedy(view: SpreadView, stopChecks: readonly SetCheck[], check: Check, finding: Finding): Remedy | null {
  const remedies = finding.remedies?.() ?? [];
  return remedies.find((remedy) => isSafe(view, stopChecks, remedy.call, check, finding)) ?? null;
}

function isSafe(view: SpreadView, stopChecks: readonly SetCheck[], call: CommandCall, check: Check, finding: Finding): boolean {
  if (NEVER_STOPS.has(call.id)) return true;
  let made = 0;
  const newId = (): string => `00000000-0000-4000-8000-${(made += 1).toString(16).padStart(12, '0')}`;
  const part = partFor(view, call);
  const patch = runCommand(part.doc, call, { prints: view.prints, trim: view.trim, newId });
  if (Object.keys(patch).length === 0) return false;
  const after = stopsOf(viewSpread({ ...part, doc: applyPatch(part.doc, patch) }), stopChecks);
  if (check.severity === 'stop' && after.has(stopKey(check, finding))) return false;
  if (after.size === 0) return true;
  const before = stopsOf(part, stopChecks);
  return [...after].every((key) => before.has(key));
}

/** Which stop it is, whatever its present wording. */
const stopKey = (check: Check, finding: Finding): string => `${check.id} ${[...finding.matIds].sort().join(' ')}`;

/** The stops that these checks find in a spread. */
export function stopsOf(view: SpreadView, stopChecks: readonly SetCheck[]): Set<string> {
  return new Set(stopChecks.flatMap(([check, set]) => check.run(view, set).map((finding) => stopKey(check, finding))));
}

/** The spread with only those mats that a command concerns; all of it for a command that names none. */
function partFor(view: SpreadView, call: CommandCall): SpreadView {
  const concerned = concernedMats(view.doc, call);
  if (concerned.size === 0) return view;
  const mats = view.doc.mats.filter((mat) => concerned.has(mat.id));
  const panes = view.doc.panes.filter((group) => group.matIds.some((id) => concerned.has(id)));
  return viewSpread({ ...view, doc: { ...view.doc, mats, panes } });
}

function concernedMats(doc: SpreadDocument, { args }: CommandCall): ReadonlySet<MatId> {
  const named = new Set<MatId>();
  if ('matId' in args) named.add(args.matId);
  if ('matIds' in args) for (const id of args.matIds) named.add(id);
  if ('groupId' in args) for (const group of doc.panes) if (group.id === args.groupId) group.matIds.forEach((id) => named.add(id));

  const groups = new Map(doc.panes.map((group) => [group.id, group]));
  const prints = new Set<PrintId>('printId' in args && args.printId !== null ? [args.printId] : []);
  const printOf = ({ content }: SpreadDocument['mats'][number]): PrintId | undefined =>
    content.kind === 'print' ? content.printId : content.kind === 'pane' ? groups.get(content.groupId)?.content?.printId : undefined;
  for (const mat of doc.mats) {
    if (!named.has(mat.id)) continue;
    const print = printOf(mat);
    if (print !== undefined) prints.add(print);
    // A pane without a print still is one thing with its group.
    if (mat.content.kind === 'pane') groups.get(mat.content.groupId)?.matIds.forEach((id) => named.add(id));
  }
  if (named.size > 0) for (const mat of doc.mats) if (prints.has(printOf(mat) ?? '')) named.add(mat.id);
  return named;
}
