import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

export const password = 'raglan-demo-2027';

/** Signs a demo person in through the page, as anybody would, and waits for where they land. */
export async function signIn(page: Page, email: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}

/** The address of the demo season of a league, whatever its name is today. */
export async function findSeason(page: Page): Promise<{ league: string; season: string }> {
  await page.waitForURL(/^[^?]*\/[a-z-]+\/[a-z]+-\d{4}\//);
  const [, league = '', season = ''] = new URL(page.url()).pathname.split('/');
  return { league, season };
}

/** No violation of WCAG 2.2 A or AA that axe can find, in what the page shows now. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
    .analyze();
  expect(
    violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join(', ')}`),
  ).toEqual([]);
}

/** Nothing sticks out at the side, however narrow the page. */
export async function expectNoSidewaysScroll(page: Page): Promise<void> {
  expect(
    await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth),
  ).toBeLessThanOrEqual(0);
}

/** Collects what the browser itself complains about: script errors and refusals of the content policy. */
export function listenForErrors(page: Page): string[] {
  const errors: string[] = [];
  page.on('pageerror', (error) => errors.push(error.message));
  page.on('console', (message) => {
    if (message.type() === 'error' && !/status of 4\d\d/.test(message.text())) errors.push(message.text());
  });
  return errors;
}

/** The page is not there for this person: the same words, or the same status, as for one that does not exist. */
export async function expectNothingThere(page: Page, path: string): Promise<void> {
  const response = await page.goto(path);
  if (response?.status() === 404) return;
  // Inside a league that the person belongs to, the frame is sent before the page is known to be none of theirs.
  await expect(page.getByText('There is no such page in this league')).toBeVisible();
}
