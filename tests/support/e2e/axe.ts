import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';

/**
 * What axe has against the page as it is, one line for each place. In legacy mode it opens no page of its
 * own, which the content security policy would not let it fill.
 */
export async function axeFaults(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).setLegacyMode(true).analyze();
  return violations.flatMap(({ id, nodes }) => nodes.map(({ html, failureSummary }) => `${id}: ${html} ${failureSummary ?? ''}`));
}

/** What stands out to the right of the window, where that makes the page scroll sideways. */
export const sidewaysScroll = (page: Page): Promise<string[]> =>
  page.evaluate(() => {
    const { scrollWidth, clientWidth } = document.documentElement;
    if (scrollWidth <= clientWidth) return [];
    const outside = [...document.querySelectorAll('body *')].filter((node) => node.getBoundingClientRect().right > clientWidth + 1);
    return [`scrolls sideways by ${scrollWidth - clientWidth} px`, ...outside.slice(0, 3).map((node) => node.outerHTML.slice(0, 160))];
  });
