import { randomUUID } from 'node:crypto';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pino } from 'pino';
import supertest from 'supertest';
import type TestAgent from 'supertest/lib/agent';
import { afterAll, beforeAll } from 'vitest';
import type { AppDeps } from '#server/app-deps';
import { readConfig, type Limits } from '#server/config';
import { FileEntity } from '#server/entities/file-entity';
import { MembershipEntity } from '#server/entities/membership-entity';
import { PrintEntity } from '#server/entities/print-entity';
import { openApp } from '#server/index';
import type { SpreadDetail } from '#shared/contracts/albums';
import type { Session } from '#shared/contracts/accounts';
import type { Role } from '#shared/model/people';
import type { Print } from '#shared/model/print';
import { buildPrint } from './builders';
import { createTestDatabase } from './database';

export const TEST_PASSWORD = 'a quiet table by the window';

export interface Person {
  /** Keeps the person's cookies. */
  readonly agent: TestAgent;
  readonly userId: string;
  readonly email: string;
  /** The studio made at sign-up, which the person owns. */
  readonly studioId: string;
}

export interface TestApp {
  readonly url: string;
  readonly deps: AppDeps;
  /** Somebody without any cookie. */
  stranger(): TestAgent;
  signUp(): Promise<Person>;
  /** A new person with that role in a studio, signed in. */
  join(studioId: string, role: Role): Promise<Person>;
}

interface TestAppOptions {
  readonly limits?: Partial<Limits>;
  readonly trustedProxies?: readonly string[];
  readonly pagesDir?: string | null;
  readonly now?: () => Date;
}

/** The whole app on a port of its own over an empty database, for the tests of one file. */
export function withApp(options: TestAppOptions = {}): () => TestApp {
  let app: TestApp | null = null;
  let close: () => Promise<void> = async () => undefined;
  beforeAll(async () => ({ app, close } = await openTestApp(options)));
  afterAll(() => close());
  return () => {
    if (!app) throw new Error('The app is there from beforeAll on, not earlier.');
    return app;
  };
}

async function openTestApp({ limits, trustedProxies = [], pagesDir = null, now }: TestAppOptions) {
  const database = await createTestDatabase();
  const dataDir = await mkdtemp(join(tmpdir(), 'pairleaf-app-'));
  const config = readConfig({ DATABASE_URL: database.url, DATA_DIR: dataDir, PORT: '0', SESSION_SECRET: 'test'.repeat(10) });
  const opened = await openApp(
    { ...config, trustedProxies, limits: { ...config.limits, signUpPerAddress: 10_000, ...limits } },
    { pagesDir, log: pino({ level: 'silent' }), checkAnswers: true, ...(now && { now }) },
  );
  const url = await opened.listen();
  const close = async (): Promise<void> => {
    await opened.close();
    await database.drop();
    await rm(dataDir, { recursive: true, force: true });
  };
  return { app: buildApp(url, opened.deps), close };
}

function buildApp(url: string, deps: AppDeps): TestApp {
  const signUp = async (): Promise<Person> => {
    const agent = supertest.agent(url);
    const email = `${randomUUID()}@example.org`;
    const body = { email, password: TEST_PASSWORD, name: 'Maud Ferrier', studioName: 'Ferrier at the Table' };
    const answer = await agent.post('/api/accounts').send(body).expect(201);
    const session = answer.body as Session;
    return { agent, email, userId: session.user.id, studioId: session.studios[0]!.id };
  };
  return {
    url,
    deps,
    stranger: () => supertest.agent(url),
    signUp,
    join: async (studioId, role) => {
      const person = await signUp();
      await deps.dataSource.manager.insert(MembershipEntity, { studioId, userId: person.userId, role, createdAt: new Date() });
      return person;
    },
  };
}

/** A print with a file row of its own, straight into the database. */
export async function insertPrint(
  { dataSource }: AppDeps,
  studioId: string,
  parts: Parameters<typeof buildPrint>[0] & { readonly contributedBy?: string; readonly pileId?: string | null } = {},
): Promise<Print> {
  const { contributedBy = null, ...printParts } = parts;
  const print = buildPrint({ id: randomUUID(), revision: 0, ...printParts, studioId });
  const { marks, ...columns } = print;
  const at = new Date();
  const fileId = randomUUID();
  await dataSource.manager.insert(FileEntity, {
    id: fileId,
    studioId,
    sha256: fileId.replaceAll('-', '').repeat(2),
    bytes: 1000,
    mediaType: 'image/jpeg',
    width: print.imageWidth,
    height: print.imageHeight,
    createdAt: at,
  });
  const { details, faces, palette, ...rest } = columns;
  await dataSource.manager.insert(PrintEntity, {
    ...rest,
    ...marks,
    details: [...details],
    faces: [...faces],
    palette: palette.map((swatch) => ({ ...swatch, oklch: [...swatch.oklch] as [number, number, number] })),
    fileId,
    contributedBy,
    binnedAt: null,
    createdAt: at,
    updatedAt: at,
  });
  return print;
}

/** An album of 12 × 12 in with one bare spread in the person's studio. */
export async function beginSpread({ agent, studioId }: Person): Promise<SpreadDetail> {
  const albumId = randomUUID();
  const spreadId = randomUUID();
  await agent.post(`/api/studios/${studioId}/albums`).send({ id: albumId, title: 'A year by the sea', formatId: '12x12in' }).expect(201);
  await agent.post(`/api/albums/${albumId}/spreads`).send({ id: spreadId, title: 'The pier' }).expect(201);
  const answer = await agent.get(`/api/spreads/${spreadId}`).expect(200);
  return answer.body as SpreadDetail;
}
