import { describe, expect, it } from 'vitest';
import { ERROR_CODES } from '#shared/errors';
import { errorSentence, errorTitle } from '#shared/words/en/errors';

describe('sentences of errors', () => {
  it.each(ERROR_CODES)('%s: one sentence that says what to do, with or without data', (code) => {
    const sentence = errorSentence(code);
    expect(sentence).toMatch(/^[A-Z].*\.$/);
    expect(sentence).toMatch(/[:,]/);
    expect(sentence).not.toMatch(/undefined|null|NaN|\[object/);
    expect(errorTitle(code)).not.toMatch(/\.$/);
  });

  it('names the fields, the first five in full', () => {
    const fields = Array.from({ length: 7 }, (_, n) => ({ path: `f${n}`, message: 'too long' }));
    expect(errorSentence('invalid-input', { fields: fields.slice(0, 1) })).toBe('These fields do not fit: f0 (too long). Correct them and send them again.');
    expect(errorSentence('invalid-input', { fields })).toMatch(/f4 \(too long\) and 2 more\./);
  });

  it('names the spreads that use a print', () => {
    expect(errorSentence('in-use', { spreads: [{ title: 'The pier' }, { title: 'Home' }] })).toMatch(/“The pier”, “Home”: take it off/);
  });

  it('says the first fault of a document and counts the others', () => {
    const faults = [{ code: 'overlap', matIds: [], data: {} }, { code: 'overlap', matIds: [], data: {} }];
    expect(errorSentence('document-refused', { faults })).toMatch(/^Two mats overlap: .* There is one more fault\.$/);
  });
});
