import { QueryClientProvider } from '@tanstack/react-query';
import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter, Route, Routes } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { safeNext, SignInForm } from '@/features/session/components/sign-in-form';
import { createQueryClient } from '@/lib/query-client';
import { fakeApi, problem, type FakeAnswer } from '../../support/fake-api';
import { buildSession } from '../../support/render-app';

function setUp(answer: FakeAnswer = [200, buildSession()], health: object = { status: 'ok', mode: 'production' }) {
  const calls = fakeApi({ 'GET /health': [200, health], 'POST /session': answer });
  render(
    <QueryClientProvider client={createQueryClient()}>
      <MemoryRouter initialEntries={['/sign-in?next=%2Falbums%2F7']}>
        <Routes>
          <Route path="/sign-in" element={<SignInForm />} />
          <Route path="/albums/7" element={<p>The album</p>} />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  );
  return calls.filter.bind(calls, ({ method }: { method: string }) => method === 'POST');
}

async function fill(email: string, password: string): Promise<void> {
  if (email !== '') await userEvent.type(screen.getByLabelText('Email'), email);
  if (password !== '') await userEvent.type(screen.getByLabelText('Password'), password);
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
}

describe('signing in', () => {
  it('goes on to where one wanted to be', async () => {
    const posts = setUp();
    await fill('marit@milllane.example', 'three unrelated words');
    expect(await screen.findByText('The album')).toBeVisible();
    expect(posts()[0]?.body).toEqual({ email: 'marit@milllane.example', password: 'three unrelated words' });
  });

  it('says in one sentence that the pair does not fit, and keeps what was typed', async () => {
    setUp(problem('sign-in-failed', 401, 'That email and password do not belong together.'));
    await fill('marit@milllane.example', 'wrong');
    expect(await screen.findByRole('alert')).toHaveTextContent('That email and password do not belong together.');
    expect(screen.getByLabelText('Email')).toHaveValue('marit@milllane.example');
  });

  it('names a field that the server could not read beside that field', async () => {
    setUp(problem('invalid-input', 400, 'Some fields do not fit.', { fields: [{ path: 'email', message: 'That is no address.' }] }));
    await fill('marit@milllane.example', 'three unrelated words');
    expect(await screen.findByRole('alert')).toHaveTextContent('That is no address.');
    expect(screen.getByLabelText('Email')).toHaveAccessibleDescription('That is no address.');
  });

  it('asks for what is missing without troubling the server', async () => {
    const posts = setUp();
    await fill('not an address', '');
    expect(screen.getByLabelText('Email')).toBeInvalid();
    expect(screen.getByLabelText('Password')).toHaveAccessibleDescription('Write your password.');
    expect(posts()).toEqual([]);
  });

  it('fills the form from a demo account, in demo mode only', async () => {
    const demoAccounts = [{ role: 'reviewer', email: 'junia@milllane.example', password: 'tide-gate' }];
    setUp(undefined, { status: 'ok', mode: 'demo', demoAccounts });
    await userEvent.click(await screen.findByRole('button', { name: 'reviewer, junia@milllane.example' }));
    expect(screen.getByLabelText('Email')).toHaveValue('junia@milllane.example');
    expect(screen.getByLabelText('Password')).toHaveValue('tide-gate');
  });
});

describe('the address to go on to', () => {
  it.each([
    ['/albums/7', '/albums/7'],
    ['//elsewhere.example', '/'],
    ['/\\elsewhere.example', '/'],
    ['https://elsewhere.example', '/'],
    [null, '/'],
  ])('%s leads to %s', (next, expected) => {
    expect(safeNext(next)).toBe(expected);
  });
});
