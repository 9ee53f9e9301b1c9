import { expect, test } from '@playwright/test';
import {
  expectAccessible,
  expectNothingThere,
  expectNoSidewaysScroll,
  listenForErrors,
  signIn,
} from './support/people';

test.use({ viewport: { width: 390, height: 844 } });

test('a referee compares two teams on a phone: who wears what, numbers that clash, kits that clash', async ({
  page,
}) => {
  const errors = listenForErrors(page);
  await signIn(page, 'referee@tern.example');
  await page.waitForURL(/\/match\/tern-estuary\//);
  await page.getByLabel('Division').selectOption('U14 Girls');
  await page.getByLabel('Home', { exact: true }).selectOption('Kestrels');
  await page.getByLabel('Away', { exact: true }).selectOption('Foxgloves');
  await expect(page.getByText(/26 has the digit 6, and only 0–5 are allowed/)).toBeVisible();
  await expect(page.getByText(/Kits (clear|close|clash)/)).toBeVisible();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);

  // A match is an address of its own: it can be kept and opened again.
  await page.reload();
  await expect(page.getByRole('heading', { name: 'Foxgloves' }).first()).toBeVisible();
  await page.getByRole('button', { name: 'Swap home and away' }).click();
  await expect(page.getByLabel('Home', { exact: true })).toHaveValue('foxgloves');
  expect(errors).toEqual([]);
});

test('a referee sees no sizes, no rosters and no people of the league', async ({ page }) => {
  await signIn(page, 'referee@tern.example');
  const season = new URL(page.url()).pathname.split('/')[3] ?? '';
  for (const path of [
    `/tern-estuary/${season}/rosters/otters`,
    '/tern-estuary/people',
    `/tern-estuary/${season}/batches`,
    '/pellbrook-valley/people',
  ]) {
    await expectNothingThere(page, path);
  }
});
