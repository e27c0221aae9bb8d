/// <reference lib="dom" />
/// <reference lib="dom.iterable" />
import type { Page } from 'playwright-core';

/** How many CSS pixels the page is wider than its window; 0 when nothing has to be scrolled sideways. */
export const sidewaysOverflow = (page: Page): Promise<number> =>
  page.evaluate(() => Math.max(0, document.documentElement.scrollWidth - document.documentElement.clientWidth));

/** Visible controls smaller than a thumb, with their size. */
export const smallTargets = (page: Page, selector: string, least = 48): Promise<string[]> =>
  page.evaluate(
    ([query, side]) =>
      [...document.querySelectorAll<HTMLElement>(query)]
        .filter((element) => element.checkVisibility({ visibilityProperty: true, opacityProperty: true }))
        .map((element) => ({ element, box: element.getBoundingClientRect() }))
        // Off the screen until it gets the focus.
        .filter(({ box }) => box.bottom > 0 && box.width > 0)
        .filter(({ box }) => box.width < side - 0.5 || box.height < side - 0.5)
        .map(
          ({ element, box }) =>
            `${element.outerHTML.slice(0, 120)} is ${box.width.toFixed(0)} × ${box.height.toFixed(0)}`,
        ),
    [selector, least] as const,
  );
