/** Widest turn of a print on the table, in degrees: TOKENS.md. */
const WIDEST = 1.4;

/** How far a print lies askew on the table, in degrees; from its id, so that it never jumps. */
export function printAngle(id: string): number {
  let hash = 0;
  for (let i = 0; i < id.length; i += 1) hash = (Math.imul(hash, 31) + id.charCodeAt(i)) | 0;
  return Math.round((((hash >>> 0) % 1000) / 999 - 0.5) * 2 * WIDEST * 10) / 10;
}
