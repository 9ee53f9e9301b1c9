import { expect, test } from '@playwright/test';
import {
  expectAccessible,
  expectNoSidewaysScroll,
  expectNothingThere,
  findSeason,
  listenForErrors,
  signIn,
} from './support/people';

test('a coordinator signs a roster off, holds it in a batch, releases it, and the shop’s bundle is made', async ({
  page,
}) => {
  const errors = listenForErrors(page);
  await signIn(page, 'coordinator@tern.example');
  const { league, season } = await findSeason(page);
  await expect(page.getByRole('heading', { name: 'Readiness', level: 1 })).toBeVisible();
  await expect(page.getByText('2 players wear 14')).toBeVisible();

  await page.goto(`/${league}/${season}/rosters/pipits`);
  await page.getByRole('button', { name: /^Sign off/ }).click();
  const confirm = page
    .getByRole('alertdialog')
    .or(page.getByRole('dialog'))
    .getByRole('button', { name: /sign off/i });
  if (await confirm.isVisible().catch(() => false)) await confirm.click();
  await expect(page.getByText(/signed off/i).first()).toBeVisible();

  await page.goto(`/${league}/${season}/batches/new`);
  await page.getByRole('button', { name: 'Pick none' }).click();
  await page.getByRole('checkbox', { name: /Pipits/ }).check();
  await page.getByRole('button', { name: 'Hold a batch of 1 team' }).click();
  await page.waitForURL(/\/batches\/b-\d+$/);
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Release 1 team' }).click();
  await page.getByRole('alertdialog').getByRole('button', { name: 'Release 1 team' }).click();
  await expect(page.getByRole('link', { name: /Download the bundle/ })).toBeVisible({ timeout: 45_000 });
  expect(errors).toEqual([]);
});

test('every page of a coordinator is accessible and fits from 360 px up', async ({ page }) => {
  test.setTimeout(300_000);
  const errors = listenForErrors(page);
  await signIn(page, 'coordinator@tern.example');
  const { league, season } = await findSeason(page);
  const at = (path: string) => `/${league}/${season}/${path}`;
  const pages = [
    at('readiness'),
    at('dates'),
    at('divisions'),
    at('divisions/new'),
    at('divisions/u12-mixed'),
    at('teams'),
    at('teams/new'),
    at('teams/herons'),
    at('teams/import'),
    at('rosters'),
    at('rosters/herons'),
    at('rosters/herons/upload'),
    at('batches'),
    at('batches/new'),
    at('batches/b-02'),
    `/${league}/number-rules`,
    `/${league}/number-rules/new`,
    `/${league}/seasons`,
    `/${league}/seasons/new`,
    `/${league}/people`,
    `/${league}/history`,
    `/${league}/settings`,
    `/match/${league}/${season}?division=u12-mixed&home=herons&away=otters`,
    '/account',
    '/leagues',
    '/leagues/new',
    '/inbox',
  ];
  for (const path of pages) {
    await page.setViewportSize({ width: 1440, height: 900 });
    await test.step(path, async () => {
      const response = await page.goto(path);
      expect(response?.status()).toBe(200);
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
      await expectAccessible(page);
      for (const width of [768, 360]) {
        await page.setViewportSize({ width, height: 780 });
        await expectNoSidewaysScroll(page);
      }
    });
  }
  expect(errors).toEqual([]);
});

test('a coordinator drafts rules, puts them in force, and sees who is blocked by them', async ({ page }) => {
  await signIn(page, 'coordinator@pellbrook.example');
  const { league, season } = await findSeason(page);
  await page.goto(`/${league}/number-rules`);
  await page.getByRole('link', { name: 'Squad numbers 1–99' }).click();
  await page.getByRole('link', { name: 'Draft a new version' }).click();
  await page.getByLabel('Allowed numbers').fill('1–2');
  await page.getByRole('button', { name: 'Save the draft' }).click();
  await page.getByRole('button', { name: 'Put version 2 in force' }).click();
  await page.getByRole('alertdialog').getByRole('button', { name: 'Put version 2 in force' }).click();
  await expect(page.getByText(/Version 2, in force/).first()).toBeVisible();
  await page.goto(`/${league}/${season}/readiness`);
  await page.getByRole('button', { name: /^Blocked/ }).click();
  await expect(page.getByRole('row').nth(1)).toBeVisible();
});

test('one league does not exist for the people of another', async ({ page }) => {
  await signIn(page, 'coordinator@pellbrook.example');
  const { season } = await findSeason(page);
  for (const path of [
    '/tern-estuary',
    '/tern-estuary/people',
    `/tern-estuary/${season}/readiness`,
    '/shop/tern-estuary/b-02',
  ]) {
    await expectNothingThere(page, path);
  }
  for (const path of [
    'batches/b-02/bundle',
    'batches/b-02/bundle.zip',
    'seasons/x/teams.csv',
    'history.csv',
  ]) {
    const response = await page.request.get(`/api/v1/leagues/tern-estuary/${path}`);
    expect([path, response.status()]).toEqual([path, 404]);
  }
});
