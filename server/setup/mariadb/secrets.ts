import { randomBytes } from 'node:crypto';
import { readFileSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { z } from 'zod';
import { SetupFailure } from '../setup-failure';

const secretsSchema = z.strictObject({
  port: z.int().positive(),
  rootPassword: z.string().min(20),
  migrationPassword: z.string().min(20),
  appPassword: z.string().min(20),
});

/** Where the private database listens and the passwords of its three accounts. */
export type DatabaseSecrets = z.infer<typeof secretsSchema>;

const fileIn = (folder: string): string => join(folder, 'database.json');

/** The kept secrets, or null where there are none yet. */
export function readSecrets(folder: string): DatabaseSecrets | null {
  let text: string;
  try {
    text = readFileSync(fileIn(folder), 'utf8');
  } catch {
    return null;
  }
  const parsed = secretsSchema.safeParse(parseJson(text));
  if (parsed.success) return parsed.data;
  throw new SetupFailure(
    `${fileIn(folder)} does not read as the database's port and passwords.`,
    'Delete that file and start again: new passwords are made, and no data is lost.',
  );
}

/** Keeps the secrets, readable by this account alone; a crash while writing leaves the old file whole. */
export function writeSecrets(folder: string, secrets: DatabaseSecrets): void {
  const draft = `${fileIn(folder)}.new`;
  writeFileSync(draft, JSON.stringify(secrets, null, 2), { mode: 0o600 });
  renameSync(draft, fileIn(folder));
}

export function makeSecrets(port: number): DatabaseSecrets {
  return { port, rootPassword: makePassword(), migrationPassword: makePassword(), appPassword: makePassword() };
}

const makePassword = (): string => randomBytes(24).toString('base64url');

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
}
