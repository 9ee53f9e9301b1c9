import { expect, test } from '@playwright/test';
import { expectAccessible, expectNoSidewaysScroll, listenForErrors } from './support/people';

test('a visitor learns what the product does and checks a roster without an account', async ({ page }) => {
  const errors = listenForErrors(page);
  await page.goto('/');
  await expect(page.getByRole('heading', { level: 1 })).toContainText('One kit plan');
  await expectAccessible(page);
  await page.getByRole('link', { name: 'Check a roster now' }).click();
  await page.waitForURL('/check');
  await page
    .getByLabel('Paste it here')
    .fill('Player\tNo.\nAdisa, Wren\t4\nCalloway, Ines\t14\nDunmore, Pip\tNo. 14\nEllery, Jonah\t26');
  await page.getByRole('button', { name: 'Check this list' }).click();
  const result = page.getByRole('region', { name: 'What the check found' });
  await expect(result.getByText('14 is also Dunmore')).toBeVisible();
  await expect(result.getByText('26 has the digit 6')).toBeVisible();
  await expectAccessible(page);
  expect(errors).toEqual([]);
});

test('a file dropped on the check is read in the browser, and what cannot be read is listed with its row', async ({
  page,
}) => {
  await page.goto('/check');
  await page.locator('input[type=file]').setInputFiles({
    name: 'list.csv',
    mimeType: 'text/csv',
    buffer: Buffer.from('Player;Number\r\nZoë Bähr;7.0\r\n;;\r\nTotal;1\r\n', 'latin1'),
  });
  await page.getByRole('button', { name: 'Check this list' }).click();
  const result = page.getByRole('region', { name: 'What the check found' });
  await expect(result.getByText('Zoë Bähr')).toBeVisible();
  await expect(result.getByText(/Row 4:/)).toBeVisible();
});

test('the check says what is wrong with a file it cannot take, and keeps what was typed', async ({
  page,
}) => {
  await page.goto('/check');
  await page.getByLabel('Paste it here').fill('keep me');
  await page
    .locator('input[type=file]')
    .setInputFiles({ name: 'photo.png', mimeType: 'image/png', buffer: Buffer.from('x') });
  await expect(page.getByText(/photo\.png is not one of/)).toBeVisible();
  await expect(page.getByLabel('Paste it here')).toHaveValue('keep me');
});

test('public pages fit a phone and a tablet, and axe finds nothing on them', async ({ page }) => {
  for (const width of [360, 390, 768]) {
    await page.setViewportSize({ width, height: 800 });
    for (const path of ['/', '/check', '/sign-in', '/sign-up', '/reset']) {
      await page.goto(path);
      await expectNoSidewaysScroll(page);
      if (width === 390) await expectAccessible(page);
    }
  }
});

test('the public API describes itself, answers as described and refuses what it does not know', async ({
  request,
}) => {
  const description = (await (await request.get('/api/v1/openapi.json')).json()) as {
    openapi: string;
    paths: Record<string, unknown>;
  };
  expect(description.openapi).toMatch(/^3\.1/);
  expect(Object.keys(description.paths)).toEqual(['/api/v1/roster-checks', '/api/v1/rule-catalogue']);
  const catalogue = (await (await request.get('/api/v1/rule-catalogue')).json()) as {
    presets: { id: string; citations: unknown[] }[];
  };
  expect(catalogue.presets.every((preset) => preset.citations.length > 0)).toBe(true);

  const check = await request.post('/api/v1/roster-checks', {
    data: { ruleSet: { preset: 'basketball-nfhs' }, players: [{ name: 'Adisa, Wren', number: '26' }] },
  });
  expect(await check.json()).toMatchObject({
    findings: [{ code: 'digit-not-allowed', severity: 'blocker', row: 0, field: 'number' }],
    summary: { players: 1, blockers: 1 },
  });

  const wrong = await request.post('/api/v1/roster-checks', {
    data: { ruleSet: { preset: 'basketball-nfhs' }, players: [{ number: '4' }] },
  });
  expect(wrong.status()).toBe(422);
  expect(wrong.headers()['content-type']).toBe('application/problem+json');
  expect(await wrong.json()).toMatchObject({ status: 422, errors: [{ path: 'players.0.name' }] });
  const large = await request.post('/api/v1/roster-checks', {
    data: { ruleSet: { preset: 'x' }, players: [{ name: 'n'.repeat(1_100_000), number: '1' }] },
  });
  expect(large.status()).toBe(413);
  const form = await request.post('/api/v1/roster-checks', { form: { a: 'b' } });
  expect(form.status()).toBe(415);
});

test('a stranger is sent to sign in, learns nothing of leagues, and is kept out of the API', async ({
  page,
  request,
}) => {
  await page.goto('/tern-estuary/people');
  await page.waitForURL(/\/sign-in\?next=/);
  const known = await request.get('/api/v1/leagues/tern-estuary/batches/b-01/bundle');
  const unknown = await request.get('/api/v1/leagues/nowhere/batches/b-01/bundle');
  expect([known.status(), unknown.status()]).toEqual([401, 401]);
});
