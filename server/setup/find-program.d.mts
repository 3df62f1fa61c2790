/** The full path of the first of these programs that this machine has, or null. */
export function findProgram(...names: string[]): string | null;
export function findMariadbd(): string | null;
export function findMariadbInstallDb(): string | null;
export function findPrintDefaults(): string | null;
export function findChromium(): string | null;
