import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { Role } from '#shared/model/people';
import type { StashSheet } from '#shared/model/stash';
import { StashView } from '@/features/stash/components/stash-view';
import { fakeApi, problem } from '../../support/fake-api';
import { buildSession, renderInApp, STUDIO_ID } from '../../support/render-app';
import { buildSheet, buildSide } from '../../support/stash';

function setUp({ role = 'owner' as Role, refuse = false, at = '/' } = {}) {
  let sheets: StashSheet[] = [
    buildSheet({ name: 'Oat', hex: '#efe6d2', quantity: 4, reserved: 3, lowAt: 1 }),
    buildSheet({ name: 'Deck chair', quantity: 2, sides: [buildSide({ pattern: 'stripe' }), buildSide({ source: 'photographed', uncertainty: 4 })] }),
  ];
  const calls = fakeApi({
    'GET /studios/:id/stash': () => [200, { sheets }],
    'POST /studios/:id/stash': ({ body }) => {
      const sheet = buildSheet(body as StashSheet);
      sheets = [...sheets, sheet];
      return [201, sheet];
    },
    'PATCH /stash-sheets/:id': ({ path, body }) => {
      if (refuse) return problem('stash-short', 409, 'Other spreads have reserved these sheets.');
      const { baseRevision, ...change } = body as { baseRevision: number };
      return [200, { ...sheets.find(({ id }) => path.endsWith(id))!, ...change, revision: baseRevision + 1 }];
    },
    'POST /studios/:id/stash/bulk': () => [200, { sheets: sheets.map((sheet) => ({ ...sheet, place: 'Drawer 9' })) }],
    'POST /studios/:id/stash/import': () => [200, { added: 1, changed: 0, faults: [{ line: 3, message: 'no', text: 'Fog,greyish' }], heading: 'name,colour' }],
  });
  renderInApp(<StashView studio={buildSession(role).studios[0]!} />, { role, at });
  return calls;
}

const row = (name: string) => screen.getByRole('rowheader', { name: new RegExp(name) }).closest('tr')!;

describe('the stash', () => {
  it('says of each sheet what it is, how its colour is known, what is reserved and what is low', async () => {
    setUp();
    await screen.findByRole('table');
    expect(row('Oat')).toHaveTextContent('pale cream');
    expect(row('Oat')).toHaveTextContent('typed in, close at best');
    expect(row('Oat')).toHaveTextContent('3 reserved');
    expect(row('Oat')).toHaveTextContent('low');
    expect(row('Deck chair')).toHaveTextContent('striped, plain on the back');
    expect(screen.getByText('2 kinds, 3 sheets free, 3 reserved, 1 low')).toBeInTheDocument();
  });

  it('counts a sheet down at once, and takes it back with a word when the server refuses', async () => {
    const calls = setUp({ refuse: true });
    await userEvent.click(await screen.findByRole('button', { name: 'One sheet of Oat fewer' }));
    expect(calls.find(({ method }) => method === 'PATCH')?.body).toEqual({ quantity: 3, baseRevision: 0 });
    expect(await screen.findByRole('alert')).toHaveTextContent('Other spreads have reserved these sheets.');
    await waitFor(() => expect(row('Oat').querySelector('.on-hand')).toHaveTextContent('4'));
  });

  it('lets nobody count below what is reserved', async () => {
    setUp();
    const fewer = await screen.findByRole('button', { name: 'One sheet of Oat fewer' });
    await userEvent.click(fewer);
    await waitFor(() => expect(fewer).toBeDisabled());
  });

  it('adds a sheet from a typed colour, and says what is missing', async () => {
    const calls = setUp();
    const form = await screen.findByRole('form', { name: 'Add sheets' });
    await userEvent.click(within(form).getByRole('button', { name: 'Add' }));
    expect(within(form).getByRole('alert')).toHaveTextContent('Write a name first.');
    await userEvent.type(within(form).getByRole('textbox', { name: 'Add' }), 'Kelp');
    const color = within(form).getByRole('textbox', { name: 'Colour' });
    await userEvent.clear(color);
    await userEvent.type(color, 'olive');
    await userEvent.click(within(form).getByRole('button', { name: 'Add' }));
    expect(await screen.findByRole('rowheader', { name: /Kelp/ })).toBeInTheDocument();
    expect(calls.find(({ method }) => method === 'POST')?.body).toMatchObject({ name: 'Kelp', quantity: 1, sides: [{ hex: '#808000', source: 'typed', uncertainty: 2 }] });
  });

  it('gives chosen sheets one place', async () => {
    const calls = setUp();
    await userEvent.click(await screen.findByRole('checkbox', { name: 'Choose all that are shown' }));
    const bar = screen.getByRole('form', { name: 'Change the chosen sheets' });
    await userEvent.type(within(bar).getByRole('textbox', { name: 'Place for all of them' }), 'Drawer 9');
    await userEvent.click(within(bar).getByRole('button', { name: 'Set' }));
    expect(await screen.findAllByText('Drawer 9')).toHaveLength(2);
    expect(calls.find(({ path }) => path.endsWith('/bulk'))?.body).toMatchObject({ change: { place: 'Drawer 9' } });
  });

  it('keeps the rows of a file that did not fit, to be mended', async () => {
    setUp();
    await userEvent.click(await screen.findByRole('button', { name: 'Bring in CSV' }));
    const dialog = screen.getByRole('dialog', { name: 'Bring in sheets' });
    const field = within(dialog).getByRole('textbox', { name: 'Rows' });
    await userEvent.click(field);
    await userEvent.paste('name,colour\nKelp,olive\nFog,greyish');
    expect(within(dialog).getByRole('status')).toHaveTextContent('Line 3 “colour” holds “greyish”');
    await userEvent.click(within(dialog).getByRole('button', { name: 'Bring in 1 row' }));
    await waitFor(() => expect(field).toHaveValue('name,colour\nFog,greyish'));
    expect(dialog).toHaveTextContent('1 added. The rows below did not fit');
  });

  it('saves a change of both sides and leaves what was not touched', async () => {
    const calls = setUp();
    await userEvent.click(await screen.findByRole('button', { name: 'More for Deck chair' }));
    await userEvent.click(screen.getByRole('menuitem', { name: 'Edit' }));
    const dialog = screen.getByRole('dialog', { name: 'Deck chair' });
    const width = within(dialog).getByRole('textbox', { name: 'Width, in' });
    await userEvent.clear(width);
    await userEvent.type(width, '8 1/2');
    await userEvent.click(within(dialog).getByRole('button', { name: 'same as the front' }));
    await userEvent.click(within(dialog).getByRole('button', { name: 'Save' }));
    await waitFor(() => expect(dialog).not.toBeInTheDocument());
    expect(calls.find(({ method }) => method === 'PATCH')?.body).toMatchObject({ name: 'Deck chair', width: 34_544, height: 48_768, sides: [{ pattern: 'stripe' }] });
  });

  it('shows a reviewer the sheets and no control that changes them', async () => {
    setUp({ role: 'reviewer' });
    await screen.findByRole('table');
    expect(screen.queryByRole('form')).not.toBeInTheDocument();
    expect(screen.queryByRole('checkbox')).not.toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /More for|fewer|Bring in/ })).not.toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Take out CSV' })).toHaveAttribute('href', `/api/studios/${STUDIO_ID}/stash/file`);
  });
});
