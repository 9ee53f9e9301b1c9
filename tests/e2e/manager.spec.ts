import { expect, test } from '@playwright/test';
import { expectAccessible, expectNothingThere, findSeason, listenForErrors, signIn } from './support/people';

test('a manager brings a list in, fixes what the rules flag by keyboard and suggestion, and submits the roster', async ({
  page,
}) => {
  const errors = listenForErrors(page);
  await signIn(page, 'manager@tern.example');
  const { league, season } = await findSeason(page);
  await page.goto(`/${league}/${season}/rosters/herons`);
  const blockers = page.getByTitle('Show only players with a blocker');
  await expect(blockers).toHaveText(/^3/);
  await expectAccessible(page);

  // From a file with headings of its own, numbers as people type them, and a row that is no player.
  await page.getByRole('link', { name: 'Add from a file' }).click();
  await page.locator('input[type=file]').setInputFiles({
    name: 'late.csv',
    mimeType: 'text/csv',
    buffer: Buffer.from('Spieler;Rückennr.;Jersey\r\n"Lindqvist, Åsa";No. 41;YM\r\nTotal;1;\r\n', 'latin1'),
  });
  await page.getByLabel('Spieler').selectOption('Name');
  await page.getByLabel('Rückennr.').selectOption('Number');
  await expect(page.getByText(/Row 3: This row/)).toBeVisible();
  await expectAccessible(page);
  await page.getByText('Add new players').click();
  await page.getByRole('button', { name: 'Import 1 player' }).click();
  await page.waitForURL(/\/rosters\/herons$/);
  await expect(
    page
      .getByRole('gridcell', { name: /Lindqvist, Åsa/ })
      .or(page.getByText('Lindqvist, Åsa'))
      .first(),
  ).toBeVisible();

  // A suggestion for the one number, the keyboard for the other.
  await page
    .getByRole('row')
    .filter({ hasText: /CALLOWAY/ })
    .getByRole('button', { name: '13', exact: true })
    .click();
  await expect(blockers).toHaveText(/^1/);
  await page
    .getByRole('row')
    .filter({ hasText: /ELLERY/ })
    .getByText('26', { exact: true })
    .click();
  await page.keyboard.type('25');
  await page.keyboard.press('Enter');
  await expect(blockers).toHaveCount(0);
  await expect(page.getByText(/^Saved \d/)).toBeVisible();

  await page.keyboard.press('Control+z');
  await expect(blockers).toHaveText(/^1/);
  await page.keyboard.press('Control+Shift+z');
  await expect(page.getByText(/^Saved \d/)).toBeVisible();

  await page.reload();
  await page.getByRole('button', { name: 'Submit roster' }).click();
  await expect(page.getByRole('button', { name: 'Take it back' })).toBeVisible();
  await page.getByRole('button', { name: 'Take it back' }).click();
  await expect(page.getByRole('button', { name: 'Submit roster' })).toBeVisible();
  expect(errors).toEqual([]);
});

test('a file that is no list is refused with a sentence, and what was typed stays', async ({ page }) => {
  await signIn(page, 'manager@tern.example');
  const { league, season } = await findSeason(page);
  await page.goto(`/${league}/${season}/rosters/herons/upload`);
  await page.getByLabel('Or paste cells from a spreadsheet').fill('typed before');
  for (const [name, bytes, says] of [
    ['list.xlsx', Buffer.from([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1, 0, 0]), /password|\.xls/i],
    ['list.csv', Buffer.from('%PDF-1.7 …'), /CSV|PDF/],
    ['empty.csv', Buffer.from(' \r\n'), /empty|no text/i],
  ] as const) {
    await page
      .locator('input[type=file]')
      .setInputFiles({ name, mimeType: 'application/octet-stream', buffer: bytes });
    await expect(page.getByRole('alert').filter({ hasText: says })).toBeVisible();
  }
  await expect(page.getByLabel('Or paste cells from a spreadsheet')).toHaveValue('typed before');
});

test('two people who edit one roster see each other’s change and lose nothing', async ({ browser }) => {
  const one = await (await browser.newContext()).newPage();
  const two = await (await browser.newContext()).newPage();
  await signIn(one, 'manager@pellbrook.example');
  const { league, season } = await findSeason(one);
  await signIn(two, 'coordinator@pellbrook.example');
  for (const page of [one, two]) await page.goto(`/${league}/${season}/rosters/hawthorns`);
  const cell = (page: typeof one) => page.getByRole('row').nth(3);
  const before = await cell(one).innerText();
  await cell(one).getByRole('gridcell').first().click();
  await one.keyboard.type('QUILL');
  await one.keyboard.press('Enter');
  await expect(one.getByText(/^Saved \d/)).toBeVisible();
  await expect(two.getByText('QUILL', { exact: true })).toBeVisible({ timeout: 20_000 });
  expect(before).not.toContain('QUILL');
});

test('a manager sees no roster of another team, no people, no batches and no other league', async ({
  page,
}) => {
  await signIn(page, 'manager@tern.example');
  const { league, season } = await findSeason(page);
  for (const path of [
    `/${league}/${season}/rosters/badgers`,
    `/${league}/${season}/rosters/badgers/upload`,
    `/${league}/people`,
    `/${league}/history`,
    `/${league}/${season}/batches`,
    '/pellbrook-valley',
  ]) {
    await expectNothingThere(page, path);
  }
});
