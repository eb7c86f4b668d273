import type { Page } from 'playwright-core';

const TARGETS =
  'button, a[href], input, textarea, select, [role=button], [role=link], [role=checkbox], [role=radio], [role=switch], [role=tab]';

/** Everything to press that is smaller than 48 px, or 44 px inside a bar of choices. */
export async function findSmallTargets(page: Page): Promise<string[]> {
  return page.evaluate((targets) => {
    // a narrow field is well enough within a larger place that leads to it
    const pressFocuses = (field: Element, least: number): boolean => {
      const place = field.parentElement;
      const { width = 0, height = 0 } = place?.getBoundingClientRect() ?? {};
      if (width < least || height < least) return false;
      place?.click();
      return document.activeElement === field;
    };
    const small: string[] = [];
    // what lies behind a dialog cannot be pressed
    const within = document.querySelector('[aria-modal=true]') ?? document;
    for (const element of within.querySelectorAll(targets)) {
      if (!element.checkVisibility() || element.closest('[inert], [aria-hidden=true]')) continue;
      const { width, height } = element.getBoundingClientRect();
      const least = element.matches('[role=radiogroup] [role=radio]') ? 44 : 48;
      if (width >= least - 0.01 && height >= least - 0.01) continue;
      if (element.matches('input') && pressFocuses(element, least)) continue;
      const name = element.getAttribute('aria-label') ?? element.textContent;
      small.push(`${name}: ${width.toFixed(1)} × ${height.toFixed(1)}`);
    }
    return small;
  }, TARGETS);
}

/** What reaches over the left or right edge of the window, where it cannot be scrolled to. */
export async function findOverflow(page: Page): Promise<string[]> {
  return page.evaluate(() => {
    const scrollsSideways = (element: Element): boolean =>
      element !== document.documentElement &&
      ['auto', 'scroll'].includes(getComputedStyle(element).overflowX) &&
      element.scrollWidth > element.clientWidth;
    const words = (element: Element) => element.textContent?.trim().slice(0, 60) ?? '';
    const found: string[] = [];
    for (const element of document.body.querySelectorAll('*')) {
      if (!element.checkVisibility() || element.closest('[inert]')) continue;
      if (scrollsSideways(element)) found.push(`scrolls sideways: ${words(element)}`);
      const { left, right, width } = element.getBoundingClientRect();
      const hidden = getComputedStyle(element).clipPath !== 'none' || width <= 1;
      if (hidden || (left >= -0.5 && right <= innerWidth + 0.5)) continue;
      if (element.closest('svg') !== null || words(element) === '') continue;
      found.push(`${left.toFixed(0)} to ${right.toFixed(0)}: ${words(element)}`);
    }
    return found;
  });
}

/** Waits until the fonts are there, no request for data is open, and nothing moves any more. */
export async function settle(page: Page): Promise<void> {
  await page.evaluate(async () => {
    await document.fonts.ready;
    await Promise.allSettled(document.getAnimations().map(({ finished }) => finished));
    await new Promise((resolve) => requestAnimationFrame(() => requestAnimationFrame(resolve)));
  });
}
