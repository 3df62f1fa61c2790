import '@testing-library/jest-dom/vitest';
import { cleanup } from '@testing-library/react';
import { afterEach, beforeEach, vi } from 'vitest';

/** What React and the browser complained about during one test. */
let complaints: string[] = [];

beforeEach(() => {
  complaints = [];
  for (const level of ['error', 'warn'] as const) {
    vi.spyOn(console, level).mockImplementation((...words: unknown[]) => {
      complaints.push(words.map(String).join(' '));
    });
  }
});

afterEach(() => {
  cleanup();
  vi.restoreAllMocks();
  if (complaints.length > 0) {
    throw new Error(`The console was not silent during this test:\n${complaints.join('\n')}`);
  }
});

// jsdom has no layout: what components ask of it gets the answer of an empty page.
class SilentObserver {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}
vi.stubGlobal('ResizeObserver', SilentObserver);
window.matchMedia ??= (query) => ({
  matches: false,
  media: query,
  onchange: null,
  addEventListener: () => {},
  removeEventListener: () => {},
  addListener: () => {},
  removeListener: () => {},
  dispatchEvent: () => false,
});
Element.prototype.scrollIntoView ??= () => {};
Element.prototype.setPointerCapture ??= () => {};
Element.prototype.releasePointerCapture ??= () => {};
Element.prototype.hasPointerCapture ??= () => false;
