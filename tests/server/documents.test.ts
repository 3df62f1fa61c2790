import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { DEMO_ACCOUNTS } from '#server/setup/demo/accounts';

const read = (path: string): string => readFileSync(new URL(`../../${path}`, import.meta.url), 'utf8');

describe('the written documents', () => {
  it('name every dependency with its licence', () => {
    const { dependencies, devDependencies } = JSON.parse(read('package.json')) as Record<string, Record<string, string>>;
    const table = read('DEVELOPERS.md').split('## Dependencies')[1] ?? '';
    const named = [...table.matchAll(/^\| (@?[a-z][\w/.-]*(?:, [@\w/.-]+)*) \|/gm)].flatMap(([, names]) => withScope(names ?? ''));
    const installed = Object.keys({ ...dependencies, ...devDependencies }).filter((name) => !name.startsWith('@types/'));
    expect(installed.filter((name) => !named.includes(name))).toEqual([]);
    expect(named.filter((name) => name !== 'package' && !installed.includes(name))).toEqual([]);
  });

  it('tell the demo accounts as they are', () => {
    for (const { role, email, password } of DEMO_ACCOUNTS) {
      expect(read('README.md')).toContain(`| ${role} | ${email} | ${password} |`);
    }
  });
});

/** `@dnd-kit/core, sortable` names two packages of one scope. */
function withScope(names: string): string[] {
  const list = names.split(', ');
  const scope = /^@[\w-]+\//.exec(list[0] ?? '')?.[0];
  return list.map((name) => (scope && !name.startsWith('@') ? scope + name : name));
}
