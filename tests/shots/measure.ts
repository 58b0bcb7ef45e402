import type { Page } from '@playwright/test';

/** From the first paint on, how much of the page has moved by itself (Layout Instability, W3C draft): call before the page loads. */
export const watchShifts = (page: Page) =>
  page.addInitScript(() => {
    const kept = window as unknown as { layoutShift: number };
    kept.layoutShift = 0;
    new PerformanceObserver((list) => {
      for (const entry of list.getEntries() as (PerformanceEntry & {
        value: number;
        hadRecentInput: boolean;
      })[])
        if (!entry.hadRecentInput) kept.layoutShift += entry.value;
    }).observe({ type: 'layout-shift', buffered: true });
  });

export const shiftOf = (page: Page) =>
  page.evaluate(() => (window as unknown as { layoutShift: number }).layoutShift);

/** What is wrong with how a page lies: wider than the screen, or text cut off at its box without a way to see the rest. */
export const layoutFaults = (page: Page) =>
  page.evaluate(() => {
    const faults: string[] = [];
    const root = document.documentElement;
    if (root.scrollWidth > root.clientWidth)
      faults.push(`page ${root.scrollWidth} px on ${root.clientWidth} px`);
    for (const element of document.querySelectorAll<HTMLElement>('body *')) {
      const style = getComputedStyle(element);
      if (style.visibility === 'hidden' || style.position === 'absolute' || element.closest('.sr-only, svg'))
        continue;
      const hasText = [...element.childNodes].some(
        (node) => node.nodeType === 3 && (node.textContent ?? '').trim(),
      );
      const isCut = style.overflowX === 'hidden' && element.scrollWidth > element.clientWidth + 1;
      if (hasText && isCut) faults.push(`cut: ${(element.textContent ?? '').trim().slice(0, 60)}`);
    }
    return faults;
  });
