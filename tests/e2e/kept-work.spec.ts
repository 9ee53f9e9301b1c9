import { expect, test, type Page } from '@playwright/test';
import { findSeason, signIn } from './support/people';

const row = (page: Page, name: RegExp) => page.getByRole('row').filter({ hasText: name });

async function openRoster(page: Page, team: string): Promise<void> {
  const { league, season } = await findSeason(page);
  await page.goto(`/${league}/${season}/rosters/${team}`);
}

async function typeInto(page: Page, name: RegExp, cell: number, text: string): Promise<void> {
  await row(page, name).getByRole('gridcell').nth(cell).click();
  await page.keyboard.type(text);
  await page.keyboard.press('Enter');
}

test('what was typed without a connection is kept, and saved when the connection is back', async ({
  page,
  context,
}) => {
  await signIn(page, 'coordinator@tern.example');
  await openRoster(page, 'lapwings');
  const first = (await page.getByRole('row').nth(1).getByRole('rowheader').innerText()).split(',')[0] ?? '';
  const name = new RegExp(first.toUpperCase());
  await context.setOffline(true);
  await row(page, name).getByRole('gridcell').nth(1).click();
  await page.keyboard.type('55');
  await page.keyboard.press('Enter');
  await expect(page.getByText(/no connection/i).first()).toBeVisible();
  await context.setOffline(false);
  await expect(page.getByText(/^Saved \d/)).toBeVisible({ timeout: 30_000 });
  await page.reload();
  await expect(row(page, name)).toContainText('55');
});

test('what was typed after a session has ended is kept, and saved once the person has signed in again', async ({
  page,
  context,
}) => {
  await signIn(page, 'coordinator@tern.example');
  await openRoster(page, 'thrift');
  const first = (await page.getByRole('row').nth(2).getByRole('rowheader').innerText()).split(',')[0] ?? '';
  const name = new RegExp(first.toUpperCase());
  await context.clearCookies();
  await typeInto(page, name, 1, '98');
  await expect(page.getByText(/sign in/i).first()).toBeVisible({ timeout: 20_000 });
  const again = await context.newPage();
  await signIn(again, 'coordinator@tern.example');
  await again.close();
  await page.bringToFront();
  await page.reload();
  await expect(row(page, name)).toContainText('98');
  await expect(page.getByText(/^Saved \d/)).toBeVisible({ timeout: 30_000 });
});
