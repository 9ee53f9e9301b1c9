import { createHash } from 'node:crypto';
import { expect, test } from '@playwright/test';
import { signIn } from './support/people';

// The application under test runs as two web and two worker processes on one database (scripts/e2e-server.mjs).
const second = process.env.RAGLAN_E2E_SECOND_URL ?? '';

test('a session begun at one web process holds at the other, and both serve the same bundle', async ({
  page,
}) => {
  await signIn(page, 'decorator@quay.example');
  await page.goto('/shop/tern-estuary/b-02');
  // A worker may still be at it; the page follows by itself.
  const link = page.getByRole('link', { name: /Download the bundle/ });
  await expect(link).toBeVisible({ timeout: 45_000 });
  const address = (await link.getAttribute('href')) ?? '';

  await page.goto(`${second}/shop/tern-estuary/b-02`);
  await expect(page.getByRole('link', { name: /Download the bundle/ })).toBeVisible();

  const here = await (await page.request.get(address)).body();
  const there = await page.request.get(`${second}${address}`);
  const hash = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');
  expect(there.status()).toBe(200);
  expect(hash(await there.body())).toBe(hash(here));

  const rest = await page.request.get(`${second}${address}`, { headers: { range: 'bytes=1000-' } });
  expect(rest.status()).toBe(206);
  expect(hash(await rest.body())).toBe(hash(here.subarray(1000)));
});
