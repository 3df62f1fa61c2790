import type { z } from 'zod';

/** One field that does not fit, by its path with dots. */
export interface FieldFault {
  readonly path: string;
  readonly message: string;
}

/** Every fault by its field, in the order found; a key that is not known is a field of its own. */
export function fieldFaults(issues: readonly z.core.$ZodIssue[]): FieldFault[] {
  return issues.flatMap((issue): FieldFault[] => {
    const path = issue.path.map(String).join('.');
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({ path: path ? `${path}.${key}` : key, message: 'there is no such field' }));
    }
    return [{ path, message: issue.message }];
  });
}
