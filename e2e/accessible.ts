import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { expect } from './journey.js';

const standards = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa'];

/** Sentinels of Fluent's focus management: hidden, and passing the focus on the moment they get it. */
const focusSentinels = '[data-tabster-dummy]';

export interface Look {
  colorScheme: 'light' | 'dark';
  width: number;
}

const each = (widths: readonly number[]): Look[] =>
  (['light', 'dark'] as const).flatMap((colorScheme) => widths.map((width) => ({ colorScheme, width })));

/** Light and dark, a desk and a hand. */
export const everyLook = each([1440, 390]);

/** For a state that differs little from one that is looked at in full. */
export const twoLooks: Look[] = [
  { colorScheme: 'light', width: 1440 },
  { colorScheme: 'dark', width: 390 },
];

/** A screen of 1280 pixels at 400 %. */
const enlarged = 320;

/** Looks at the page as it stands; enlarged, nothing may lie beyond the edge either. */
export async function expectAccessible(page: Page, looks: readonly Look[] = everyLook): Promise<void> {
  for (const { colorScheme, width } of looks) {
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
    await page.setViewportSize({ width, height: 900 });
    await expect(page.locator('html')).toHaveCSS('color-scheme', colorScheme);
    await settled(page);
    const variant = `${colorScheme}, ${width} px`;
    const axe = new AxeBuilder({ page }).withTags(standards).exclude(focusSentinels);
    const { violations } = await axe.analyze();
    const found = violations.flatMap(({ id, nodes }) =>
      nodes.map(({ html, any }) => `${id}: ${html} ${any.map(({ message }) => message).join(' ')}`),
    );
    expect.soft(found, variant).toEqual([]);
    await expectNoSidewaysScroll(page, variant);
  }
  const { width = enlarged } = looks.at(-1) ?? {};
  await page.setViewportSize({ width: enlarged, height: 900 });
  await settled(page);
  await expectNoSidewaysScroll(page, `${enlarged} px`);
  await page.setViewportSize({ width, height: 900 });
}

async function expectNoSidewaysScroll(page: Page, variant: string): Promise<void> {
  const overflow = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect.soft(overflow, `sideways scroll, ${variant}`).toBeLessThanOrEqual(0);
}

/** Colours fade, and an element's fading may set off its children's: nobody reads what is half way through. */
async function settled(page: Page): Promise<void> {
  await page.evaluate(async () => {
    const frame = () => new Promise((resolve) => requestAnimationFrame(resolve));
    // In what is folded away a fading stays on the list after its end.
    const moves = () => document.getAnimations().some(({ playState }) => playState !== 'finished');
    for (let still = 0; still < 5; still = moves() ? 0 : still + 1) await frame();
  });
}
