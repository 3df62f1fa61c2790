import { beforeAll, describe, expect, it } from 'vitest';
import { beginSpread, withApp, type Person } from '../../support/app';

describe('what is said about checks', () => {
  const app = withApp();
  let owner: Person;
  let spreadId: string;
  const ofStudio = (checkId = '') => `/api/studios/${owner.studioId}/checks${checkId && `/${checkId}`}`;
  const ofSpread = (checkId: string) => `/api/spreads/${spreadId}/checks/${checkId}`;
  const inSpread = async () => (await owner.agent.get(`/api/spreads/${spreadId}`).expect(200)).body.checks;

  beforeAll(async () => {
    owner = await app().signUp();
    spreadId = (await beginSpread(owner)).id;
  });

  it('nothing at first; then what was muted comes with the spread, and goes when it is heard again', async () => {
    expect(await inSpread()).toEqual({ studio: [], spread: [] });
    const designer = await app().join(owner.studioId, 'designer');
    await designer.agent.patch(ofSpread('no-title')).send({ muted: true }).expect(200, { checks: [{ checkId: 'no-title', muted: true, thresholds: {} }] });
    await owner.agent.patch(ofStudio('no-journaling')).send({ muted: true }).expect(200);
    expect(await inSpread()).toEqual({
      studio: [{ checkId: 'no-journaling', muted: true, thresholds: {} }],
      spread: [{ checkId: 'no-title', muted: true, thresholds: {} }],
    });
    await owner.agent.patch(ofSpread('no-title')).send({ muted: null }).expect(200, { checks: [] });
    await owner.agent.patch(ofStudio('no-journaling')).send({ muted: null }).expect(200, { checks: [] });
  });

  it('thresholds stay when a check is muted, and the other way round; null takes them back', async () => {
    await owner.agent.patch(ofStudio('pages-unequal')).send({ thresholds: { difference: 30 } }).expect(200);
    const { body } = await owner.agent.patch(ofStudio('pages-unequal')).send({ muted: true }).expect(200);
    expect(body.checks).toEqual([{ checkId: 'pages-unequal', muted: true, thresholds: { difference: 30 } }]);
    await owner.agent.patch(ofStudio('pages-unequal')).send({ muted: null }).expect(200);
    expect((await owner.agent.get(ofStudio()).expect(200)).body.checks).toEqual([{ checkId: 'pages-unequal', muted: null, thresholds: { difference: 30 } }]);
    await owner.agent.patch(ofStudio('pages-unequal')).send({ thresholds: null }).expect(200, { checks: [] });
  });

  it('a threshold out of its range, one that the check does not have and a check that is none are refused by name', async () => {
    const refused = async (path: string, body: object) => (await owner.agent.patch(path).send(body).expect(400)).body.fields;
    expect(await refused(ofStudio('pages-unequal'), { thresholds: { difference: 81 } })).toEqual([{ path: 'thresholds.difference', message: 'must be from 4 to 80' }]);
    expect(await refused(ofStudio('pages-unequal'), { thresholds: { colour: 1 } })).toEqual([{ path: 'thresholds.colour', message: 'this check has no such limit' }]);
    expect(await refused(ofStudio('pages-unequal'), { muted: 'yes' })).toMatchObject([{ path: 'muted' }]);
    expect(await refused(ofSpread('no-such-check'), { muted: true })).toMatchObject([{ path: 'checkId' }]);
    expect(await inSpread()).toEqual({ studio: [], spread: [] });
  });

  it('two people who mute different checks at once do not meet', async () => {
    const checks = ['no-title', 'no-journaling', 'shaving', 'bare-mat'];
    await Promise.all(checks.map((id) => owner.agent.patch(ofSpread(id)).send({ muted: true }).expect(200)));
    expect((await inSpread()).spread.map(({ checkId }: { checkId: string }) => checkId)).toEqual([...checks].sort());
    await Promise.all(checks.map(() => owner.agent.patch(ofSpread('no-title')).send({ muted: null }).expect(200)));
    expect((await inSpread()).spread).toHaveLength(3);
  });

  it('go with their spread', async () => {
    const other = await beginSpread(owner);
    await owner.agent.patch(`/api/spreads/${other.id}/checks/no-title`).send({ muted: true }).expect(200);
    await owner.agent.delete(`/api/spreads/${other.id}`).expect(204);
    const left = await app().deps.dataSource.query('SELECT COUNT(*) AS n FROM check_settings WHERE scope_id = ?', [other.id]);
    expect(Number(left[0].n)).toBe(0);
  });
});
