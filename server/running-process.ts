import { readFileSync } from 'node:fs';

/**
 * Whether a process still runs. One that has ended keeps its id until its parent asks how, which in a container may
 * be never; such a one runs no more.
 */
export function isRunning(pid: number): boolean {
  try {
    process.kill(pid, 0);
  } catch (error) {
    // EPERM: it runs, under another account.
    return error instanceof Error && 'code' in error && error.code === 'EPERM';
  }
  return statOf(pid)[0] !== 'Z';
}

/** When a process started, in the kernel's ticks since boot (proc(5), field 22); null where there is no /proc. */
export const startOf = (pid: number): string | null => statOf(pid)[19] ?? null;

/** proc(5)'s fields from the third on, which is the state; none where there is no /proc. */
function statOf(pid: number): string[] {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The name in field 2 may hold spaces, so count from its closing bracket.
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ');
  } catch {
    return [];
  }
}
