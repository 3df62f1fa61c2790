import { spawn } from 'node:child_process';
import { stripVTControlCharacters } from 'node:util';

export interface QuietRun {
  readonly code: number;
  readonly output: string;
}

/** Runs a program to its end and keeps what it says, for the case that it fails. Never rejects. */
export function runQuietly(
  program: string,
  args: readonly string[],
  options: { cwd: string; uid?: number; gid?: number },
): Promise<QuietRun> {
  return new Promise((resolve) => {
    let output = '';
    // A group of its own, so that a stop of this process ends the program's own children too.
    const child = spawn(program, args, { ...options, stdio: ['ignore', 'pipe', 'pipe'], detached: true });
    const endGroup = (): void => {
      try {
        if (child.pid !== undefined) process.kill(-child.pid, 'SIGKILL');
      } catch {
        // It has ended by itself.
      }
    };
    process.once('exit', endGroup);
    const settle = (run: QuietRun): void => {
      process.off('exit', endGroup);
      resolve({ ...run, output: stripVTControlCharacters(run.output) });
    };
    const collect = (chunk: Buffer): void => void (output += chunk.toString());
    child.stdout.on('data', collect);
    child.stderr.on('data', collect);
    child.on('error', (error) => settle({ code: 1, output: output + error.message }));
    child.on('close', (code) => settle({ code: code ?? 1, output }));
  });
}
