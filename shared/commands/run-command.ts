import { findDocumentFaults, type DocumentFault, type DocumentFaultCode } from '../model/document-faults';
import { diffDocuments, type Patch } from '../model/patch';
import type { SpreadDocument } from '../model/spread';
import type { CommandCall, CommandId } from './calls';
import { isRefusal, type CommandContext, type CommandRun, type Reason } from './command';
import { addMat, deleteMats, duplicateMat } from './mats-add';
import { mirrorMats, moveMats, resizeMat, turnMat } from './mats-arrange';
import { mergeMats, splitMat } from './mats-divide';
import { applyScheme, setContent, setFocal, setInner, setLaidOver, setMatColor, setReveal, setSpreadReveal, setTrueSize } from './mats-look';
import { mirrorPage, setPageColor, swapPages, useSketch } from './pages';
import { groupPanes, setRun, ungroupPanes } from './panes';
import { scalePrint, setWhole, slideWindowTo, turnPrint } from './placement';
import { liftPrints, movePrint, placePrint } from './prints';
import { settle } from './settle';
import { addToTable, removeFromTable } from './table';

const COMMANDS: { readonly [Id in CommandId]: CommandRun<Id> } = {
  'prints.place': placePrint,
  'prints.move': movePrint,
  'prints.lift': liftPrints,
  'window.slide': slideWindowTo,
  'placement.setWhole': setWhole,
  'placement.turn': turnPrint,
  'placement.scale': scalePrint,
  'mats.add': addMat,
  'mats.delete': deleteMats,
  'mats.duplicate': duplicateMat,
  'mats.move': moveMats,
  'mats.resize': resizeMat,
  'mats.split': splitMat,
  'mats.merge': mergeMats,
  'mats.mirror': mirrorMats,
  'mats.turn': turnMat,
  'mats.setColor': setMatColor,
  'mats.setReveal': setReveal,
  'mats.setInner': setInner,
  'mats.setTrueSize': setTrueSize,
  'mats.setFocal': setFocal,
  'mats.setLaidOver': setLaidOver,
  'mats.setContent': setContent,
  'panes.group': groupPanes,
  'panes.ungroup': ungroupPanes,
  'panes.setRun': setRun,
  'pages.mirror': mirrorPage,
  'pages.swap': swapPages,
  'pages.setColor': setPageColor,
  'pages.useSketch': useSketch,
  'spread.setReveal': setSpreadReveal,
  'scheme.apply': applyScheme,
  'table.add': addToTable,
  'table.remove': removeFromTable,
};

/** A command's patch, or why there is none. */
export type CommandResult = { readonly patch: Patch; readonly reason: null } | { readonly patch: null; readonly reason: Reason };

/**
 * Runs a command and judges what it would make: a document with a fault that it did not have before is
 * refused, so no command can leave a faulty document, whatever its arguments.
 */
export function tryCommand(doc: SpreadDocument, call: CommandCall, context: CommandContext): CommandResult {
  const run = COMMANDS[call.id] as CommandRun<CommandId>;
  const outcome = run(doc, call.args, context);
  if (isRefusal(outcome)) return { patch: null, reason: outcome.refused };
  const next = settle(doc, outcome, context);
  const patch = diffDocuments(doc, next);
  if (Object.keys(patch).length === 0) return { patch: null, reason: 'nothing-to-do' };
  const fault = newFaults(doc, next)[0];
  return fault ? { patch: null, reason: FAULT_REASONS[fault.code] } : { patch, reason: null };
}

function newFaults(before: SpreadDocument, next: SpreadDocument): DocumentFault[] {
  const faults = findDocumentFaults(next);
  if (faults.length === 0) return faults;
  const key = ({ code, matIds }: DocumentFault): string => [code, ...matIds].join(' ');
  const known = new Set(findDocumentFaults(before).map(key));
  return faults.filter((fault) => !known.has(key(fault)));
}

/** What a person did wrong where a command would have led to a fault. The last few no command can lead to by itself. */
const FAULT_REASONS: Record<DocumentFaultCode, Reason> = {
  'off-grid': 'off-page',
  overlap: 'onto-another-mat',
  'page-missing': 'no-such-page',
  'true-size-too-large': 'true-size-too-large',
  'no-room-for-photo': 'no-room-for-photo',
  'no-room-for-inner-mat': 'no-room-for-inner-mat',
  'too-many-mats': 'spread-full',
  'document-too-large': 'spread-full',
  'pane-too-few': 'too-few-mats',
  'pane-two-pages': 'on-two-pages',
  'unknown-print': 'no-such-print',
  'duplicate-id': 'nothing-to-do',
  'print-listed-twice': 'nothing-to-do',
  'pane-member-missing': 'nothing-to-do',
  'pane-content-differs': 'nothing-to-do',
  'pane-in-two-groups': 'nothing-to-do',
  'pane-without-group': 'nothing-to-do',
  'out-of-order': 'nothing-to-do',
};

/** The command's patch; empty where there is nothing to do or it cannot be done. */
export const runCommand = (doc: SpreadDocument, call: CommandCall, context: CommandContext): Patch => tryCommand(doc, call, context).patch ?? {};

/** Why the command would do nothing, or null where it would do something. */
export const whyNot = (doc: SpreadDocument, call: CommandCall, context: CommandContext): Reason | null => tryCommand(doc, call, context).reason;
