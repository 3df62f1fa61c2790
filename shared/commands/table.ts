import { refuse, type CommandRun } from './command';
import { shownPrints } from './pictures';

export const addToTable: CommandRun<'table.add'> = (doc, { printIds }, context) => {
  if (printIds.some((id) => !context.prints.has(id))) return refuse('no-such-print');
  return { ...doc, table: [...new Set([...doc.table, ...printIds])] };
};

/** A print that lies on a mat stays chosen; it has to be lifted first. */
export const removeFromTable: CommandRun<'table.remove'> = (doc, { printIds }) => {
  const shown = shownPrints(doc);
  const leaving = new Set(printIds.filter((id) => !shown.has(id)));
  if (printIds.length > 0 && leaving.size === 0) return refuse('still-placed');
  return { ...doc, table: doc.table.filter((id) => !leaving.has(id)) };
};
