import { randomUUID } from 'node:crypto';
import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pino } from 'pino';
import { afterAll, beforeAll } from 'vitest';
import { readConfig } from '#server/config';
import { MembershipEntity } from '#server/entities/membership-entity';
import { openApp, type OpenedApp } from '#server/index';
import { sessionSchema } from '#shared/contracts/accounts';
import type { Role } from '#shared/model/people';
import { withDatabase } from './database';

/** Somebody signed in, and the studio that they signed up with. */
export interface Person {
  readonly cookie: string;
  readonly userId: string;
  readonly studioId: string;
}

export interface PictureApp {
  readonly url: string;
  readonly app: OpenedApp;
  readonly dataDir: string;
  signUp(): Promise<Person>;
  /** Makes a person a member of somebody's studio. */
  join(person: Person, studioId: string, role: Role): Promise<void>;
  /** A request as that person makes it; null for nobody. */
  ask(person: Person | null, path: string, init?: RequestInit): Promise<Response>;
  /** Posts one file as a form does. */
  upload(person: Person | null, studioId: string, file: Blob | null, fields?: Readonly<Record<string, string>>, name?: string): Promise<Response>;
  /** Names of all files on the disk that belong to uploads on their way. */
  incomingFiles(): Promise<string[]>;
}

/** The app on a port of its own with real workers and a data folder of its own, for the tests of one file. */
export function withPictureApp(env: Readonly<Record<string, string>> = {}): () => PictureApp {
  const database = withDatabase();
  let running: PictureApp | null = null;
  beforeAll(async () => {
    const dataDir = await mkdtemp(join(tmpdir(), 'pairleaf-pictures-'));
    const config = readConfig({
      DATABASE_URL: database().url,
      DATA_DIR: dataDir,
      PORT: '0',
      SESSION_SECRET: 'for tests only, for tests only, for tests only',
      SIGN_UP_PER_ADDRESS: '1000',
      FREE_DISK_BYTES: '0',
      ...env,
    });
    const app = await openApp(config, { pagesDir: null, log: pino({ level: 'silent' }), checkAnswers: true });
    running = drive(app, await app.listen(), dataDir);
  });
  afterAll(async () => {
    await running?.app.close();
    if (running) await rm(running.dataDir, { recursive: true, force: true });
  });
  return () => {
    if (!running) throw new Error('The app is there from beforeAll on, not earlier.');
    return running;
  };
}

function drive(app: OpenedApp, url: string, dataDir: string): PictureApp {
  const ask: PictureApp['ask'] = (person, path, init = {}) =>
    fetch(`${url}/api${path}`, { ...init, headers: { ...(person && { cookie: person.cookie }), ...init.headers } });

  return {
    url,
    app,
    dataDir,
    ask,
    signUp: async () => {
      const body = { email: `${randomUUID()}@example.test`, password: 'a long enough password', name: 'Ada', studioName: 'Harbour Row' };
      const response = await fetch(`${url}/api/accounts`, {
        method: 'POST',
        headers: { 'content-type': 'application/json' },
        body: JSON.stringify(body),
      });
      const { user, studios } = sessionSchema.parse(await response.json());
      const cookie = response.headers.getSetCookie().map((line) => line.split(';')[0]).join('; ');
      return { cookie, userId: user.id, studioId: studios[0]!.id };
    },
    join: async ({ userId }, studioId, role) => {
      await app.deps.dataSource.manager.insert(MembershipEntity, { studioId, userId, role, createdAt: new Date() });
    },
    upload: (person, studioId, file, fields = {}, name = 'photo.jpg') => {
      const form = new FormData();
      for (const [key, value] of Object.entries(fields)) form.append(key, value);
      if (file) form.append('file', file, name);
      return ask(person, `/studios/${studioId}/prints`, { method: 'POST', body: form });
    },
    incomingFiles: async () => {
      const entries = await readdir(join(dataDir, 'incoming'), { recursive: true, withFileTypes: true });
      return entries.filter((entry) => entry.isFile()).map(({ name }) => name);
    },
  };
}
