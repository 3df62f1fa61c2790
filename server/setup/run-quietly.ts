import { spawn } from 'node:child_process';

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
    const child = spawn(program, args, { ...options, stdio: ['ignore', 'pipe', 'pipe'] });
    const collect = (chunk: Buffer): void => void (output += chunk.toString());
    child.stdout.on('data', collect);
    child.stderr.on('data', collect);
    child.on('error', (error) => resolve({ code: 1, output: output + error.message }));
    child.on('close', (code) => resolve({ code: code ?? 1, output }));
  });
}
