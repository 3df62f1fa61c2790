import { ESLint } from 'eslint';
import { describe, expect, it } from 'vitest';

const eslint = new ESLint();

/** The rules that a file with this code and place breaks, each once. */
async function brokenRules(filePath: string, code: string): Promise<(string | null)[]> {
  const [result] = await eslint.lintText(code, { filePath });
  return [...new Set(result?.messages.map(({ ruleId }) => ruleId))];
}

const IMPORTS = '@typescript-eslint/no-restricted-imports';
const importing = (from: string): string => `export { thing } from '${from}';\n`;

describe('the directions of import that the linter holds', () => {
  it.each([
    ['shared code', 'shared/model/a.ts', '../../server/app'],
    ['shared code', 'shared/model/a.ts', '#server/app'],
    ['shared code', 'shared/model/a.ts', '@/lib/api'],
    ['shared code', 'shared/model/a.ts', 'node:fs'],
    ['shared code', 'shared/model/a.ts', 'react'],
    ['shared code', 'shared/model/a.ts', '#shared/model/length'],
    ['the server', 'server/services/a.ts', '@/lib/api'],
    ['the server', 'server/services/a.ts', '../../src/lib/api'],
    ['the server', 'server/services/a.ts', '../../tests/support/builders'],
    ['lib', 'src/lib/a.ts', '@/features/albums/api/album-queries'],
    ['lib', 'src/lib/a.ts', '#server/app'],
    ['lib', 'src/lib/a.ts', 'node:fs'],
    ['a component', 'src/components/a.tsx', '../features/albums/components/album-card'],
    ['a component', 'src/components/a.tsx', '@/routes/album'],
    ['a feature', 'src/features/albums/components/a.tsx', '@/features/composer/model/composer-store'],
    ['a feature', 'src/features/albums/components/a.tsx', '../../composer/model/composer-store'],
    ['a feature', 'src/features/albums/components/a.tsx', '@/routes/album'],
    ['a feature', 'src/features/albums/components/a.tsx', '@/router'],
    ['a feature', 'src/features/composer/canvas/a.tsx', '../../../../server/app'],
    ['a route', 'src/routes/a.tsx', '@/router'],
    ['a route', 'src/routes/a.tsx', '#server/app'],
  ])('%s (%s) may not import %s', async (_who, file, from) => {
    expect(await brokenRules(file, importing(from))).toEqual([IMPORTS]);
  });

  it.each([
    ['shared/model/a.ts', 'zod'],
    ['shared/colour/a.ts', 'colorjs.io'],
    ['shared/checks/a.ts', '../model/length'],
    ['server/services/a.ts', '../../shared/model/length'],
    ['server/images/a.ts', 'node:fs'],
    ['src/components/a.tsx', '@/lib/api'],
    ['src/features/albums/components/a.tsx', '../components/b'],
    ['src/features/albums/components/a.tsx', '@/features/albums/api/album-queries'],
    ['src/features/albums/components/a.tsx', '#shared/model/length'],
    ['src/routes/a.tsx', '@/features/composer/model/composer-store'],
    ['src/router.tsx', '@/routes/album'],
  ])('%s may import %s', async (file, from) => {
    expect(await brokenRules(file, importing(from))).toEqual([]);
  });

  it.each([
    ['Date.now', 'export const now = Date.now();\n', 'no-restricted-properties'],
    ['new Date()', 'export const now = new Date();\n', 'no-restricted-syntax'],
    ['Math.random', 'export const dice = Math.random();\n', 'no-restricted-properties'],
    ['process', 'export const env = process.env;\n', 'no-restricted-globals'],
    ['document', 'export const title = document.title;\n', 'no-restricted-globals'],
    ['a default export', 'export default 1;\n', 'no-restricted-exports'],
    ['more than 400 lines', 'export const a = 1;\n' + '\n'.repeat(400), 'max-lines'],
  ])('shared code may not have %s', async (_what, code, rule) => {
    expect(await brokenRules('shared/model/a.ts', code)).toEqual([rule]);
  });

  it('lets no test be skipped', async () => {
    expect(await brokenRules('tests/shared/a.test.ts', "it.skip('works', () => {});\n")).toEqual(['no-restricted-syntax']);
  });
});
