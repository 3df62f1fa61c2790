import type { Check, Threshold } from '#shared/checks/check';
import { CHECK_IDS, type CheckId } from '#shared/checks/check-ids';
import { CHECKS } from '#shared/checks/registry';
import { CHECK_HELP } from '#shared/words/en/check-help';
import { formatLength } from '#shared/words/measure';

/** A threshold's value in words, lengths in both units. */
export function thresholdWords(value: number, { unit }: Pick<Threshold, 'unit'>): string {
  switch (unit) {
    case 'length':
      return `${formatLength(value, 'in')} in (${formatLength(value, 'mm')} mm)`;
    case 'share':
      return `${Math.round(value * 100)} %`;
    case 'steps':
      return value === 1 ? '1 step' : `${value} steps`;
    case 'ratio':
      return `${value} times`;
    case 'degrees':
      return `${value}°`;
    case 'points':
    case 'count':
      return String(value);
  }
}

/** Where a check comes from, in one sentence. */
export const basisWords = ({ basis }: Pick<Check, 'basis'>): string =>
  basis.kind === 'published' ? `A published measure: ${basis.source}.` : 'Common practice in the trade; the limits are our own.';

const HAYSTACKS: ReadonlyMap<CheckId, string> = new Map(
  CHECK_IDS.map((id) => [id, [CHECK_HELP[id].name, CHECK_HELP[id].why, CHECK_HELP[id].rule, CHECKS[id].severity].join(' ').toLowerCase()]),
);

/** The checks that speak of every word asked for, in the registry's order. */
export function findChecks(query: string): CheckId[] {
  const words = query.toLowerCase().split(/\s+/).filter(Boolean);
  return CHECK_IDS.filter((id) => words.every((word) => HAYSTACKS.get(id)!.includes(word)));
}
