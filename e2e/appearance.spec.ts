import type { Page } from '@playwright/test';
import { expect, stillfoot, studyId, test } from './journey.js';

interface Weighed {
  options: { optionId: string }[];
}

/** Brass of the palette, the fill of the one primary button, on light and on dark ground. */
const brass = { light: 'rgb(138, 92, 26)', dark: 'rgb(217, 178, 106)' };

/** The fonts that the browser has really drawn an element's text with. */
async function fontsDrawn(page: Page, selector: string): Promise<{ family: string; own: boolean }[]> {
  const devtools = await page.context().newCDPSession(page);
  await devtools.send('DOM.enable');
  await devtools.send('CSS.enable');
  const { root } = await devtools.send('DOM.getDocument');
  const { nodeId } = await devtools.send('DOM.querySelector', { nodeId: root.nodeId, selector });
  const { fonts } = await devtools.send('CSS.getPlatformFontsForNode', { nodeId });
  await devtools.detach();
  return fonts.map(({ familyName, isCustomFont }) => ({ family: familyName, own: isCustomFont }));
}

for (const colorScheme of ['light', 'dark'] as const) {
  test(`buttons are filled with the ${colorScheme} palette under the strict policy`, async ({ page }) => {
    await page.emulateMedia({ colorScheme });
    const response = await page.goto('/sign-in');
    const policy = (await response?.headerValue('content-security-policy')) ?? '';
    expect(policy).toContain("script-src 'self'");
    expect(policy).not.toMatch(/unsafe-(inline|eval)/);
    await expect(page.getByRole('button', { name: 'Sign in', exact: true })).toHaveCSS(
      'background-color',
      brass[colorScheme],
    );
  });
}

test('every page is set in Lato, which came from the application itself', async ({ page, signIn }) => {
  const fonts: string[] = [];
  page.on('response', (response) => {
    if (response.request().resourceType() === 'font' && response.ok()) fonts.push(response.url());
  });
  const visit = async (path: string) => {
    await page.goto(path);
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
    await page.evaluate(() => document.fonts.ready);
    for (const selector of ['h1', 'main p']) {
      const element = page.locator(selector).first();
      await expect(element).toHaveCSS('font-family', /\bLato\b/);
      const drawn = await fontsDrawn(page, selector);
      expect(drawn, `${selector} on ${path}`).toContainEqual({
        family: expect.stringMatching(/^Lato\b/),
        own: true,
      });
    }
  };

  await visit('/sign-in');
  expect(fonts.length).toBeGreaterThan(0);
  await signIn(stillfoot.methodologist);
  const id = await studyId(page, 'Stillfoot');
  const { options }: Weighed = await (await page.request.get(`/api/studies/${id}/weigh`)).json();
  await visit('/');
  await visit(`/studies/${id}/weigh`);
  for (const { optionId } of options) await visit(`/studies/${id}/options/${optionId}`);
  await visit('/no/such/page');
});
