import { createHash } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { expect, test } from '@playwright/test';
import JSZip from 'jszip';
import { expectAccessible, expectNothingThere, listenForErrors, signIn } from './support/people';

test('a decorator sees released batches of both leagues, downloads a bundle whose every file matches its manifest, and marks it packed', async ({
  page,
}) => {
  const errors = listenForErrors(page);
  await signIn(page, 'decorator@quay.example');
  await page.waitForURL('/shop');
  await expect(page.getByText('Tern Estuary Basketball League').first()).toBeVisible();
  await expect(page.getByText('Pellbrook Valley Football League').first()).toBeVisible();
  await expectAccessible(page);

  await page.getByRole('link', { name: 'B-02' }).click();
  const download = page.getByRole('link', { name: /Download the bundle/ });
  // The worker may still be at it; the page follows by itself.
  await expect(download).toBeVisible({ timeout: 45_000 });
  await expectAccessible(page);
  const [file] = await Promise.all([page.waitForEvent('download'), download.click()]);
  const zip = await JSZip.loadAsync(await readFile(await file.path()));
  const manifest = JSON.parse((await zip.file('manifest.json')?.async('string')) ?? '') as {
    files: { path: string; sha256: string }[];
  };
  expect(manifest.files.length).toBeGreaterThan(8);
  for (const entry of manifest.files) {
    const bytes = await zip.file(entry.path)?.async('uint8array');
    expect([entry.path, bytes && createHash('sha256').update(bytes).digest('hex')]).toEqual([
      entry.path,
      entry.sha256,
    ]);
  }
  expect(JSON.stringify(manifest)).not.toContain('@');

  await page.getByRole('button', { name: 'Mark packed' }).click();
  await expect(page.getByText('The batch is packed').first()).toBeVisible();
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(page.getByText('The batch is on press').first()).toBeVisible();
  expect(errors).toEqual([]);
});

test('a decorator sees no held batch, no roster, no person and no contact of a league', async ({ page }) => {
  await signIn(page, 'decorator@quay.example');
  await page.waitForURL('/shop');
  await expect(page.getByText('B-03')).toHaveCount(0);
  for (const path of [
    '/shop/tern-estuary/b-03',
    '/tern-estuary/people',
    '/tern-estuary/history',
    '/tern-estuary/settings',
  ]) {
    await expectNothingThere(page, path);
  }
  await page.goto('/shop/tern-estuary/b-02');
  expect(await page.content()).not.toMatch(/coordinator@|manager\d*@/);
});
