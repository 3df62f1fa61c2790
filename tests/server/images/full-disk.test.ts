import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { problemSchema } from '#shared/contracts/common';
import { withPictureApp } from '../../support/picture-app';
import { noisy, sharpOf } from '../../support/pictures';

const app = withPictureApp({ FREE_DISK_BYTES: String(Number.MAX_SAFE_INTEGER) });

it('an upload to a full disk is refused before it is read, and stores nothing', async () => {
  const person = await app().signUp();
  const file = new Blob([new Uint8Array(await sharpOf(noisy(300, 200)).jpeg().toBuffer())]);
  const problem = problemSchema.parse(await (await app().upload(person, person.studioId, file)).json());
  expect(problem).toMatchObject({ status: 507, code: 'disk-full' });
  expect(problem.detail).toMatch(/nothing was stored/);
  expect(await app().incomingFiles()).toEqual([]);
  expect(await readdir(app().dataDir)).not.toContain(person.studioId);
  expect(await readdir(join(app().dataDir, 'files')).catch(() => [])).toEqual([]);
});
