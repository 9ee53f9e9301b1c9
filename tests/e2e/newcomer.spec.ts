import { expect, test, type APIRequestContext } from '@playwright/test';
import { expectAccessible, listenForErrors } from './support/people';

type Message = { to: string; subject: string; text: string };

/** The link of the newest e-mail to an address; the worker sends within moments. */
async function readLink(request: APIRequestContext, to: string, pattern: RegExp): Promise<string> {
  let link = '';
  await expect
    .poll(async () => {
      const inbox = (await (await request.get(`${process.env['RAGLAN_E2E_INBOX_URL']}/messages`)).json()) as
        Message[] | { messages: Message[] };
      const messages = Array.isArray(inbox) ? inbox : inbox.messages;
      link =
        messages
          .filter((message) => JSON.stringify(message.to).includes(to))
          .map((message) => pattern.exec(message.text)?.[0] ?? '')
          .find(Boolean) ?? '';
      return link;
    })
    .not.toBe('');
  return link;
}

test('a newcomer opens an account by e-mail and creates a league with its first season and division', async ({
  page,
  request,
}) => {
  const errors = listenForErrors(page);
  const email = 'founder@harbour.example';
  await page.goto('/sign-up');
  await page.getByLabel(/name/i).first().fill('Ida Founder');
  await page.getByLabel('E-mail').fill(email);
  await expectAccessible(page);
  await page.locator('form').getByRole('button').first().click();
  const link = await readLink(request, email, /http\S+\/sign-up\/\S+/);
  await page.goto(link);
  await page
    .getByLabel(/password/i)
    .first()
    .fill('harbour wall at dawn');
  await page
    .locator('form')
    .getByRole('button', { name: /account|start|go on|open/i })
    .click();
  await page.waitForURL(/\/leagues/);
  await page.goto('/leagues/new');
  await expectAccessible(page);
  const next = page
    .locator('form')
    .getByRole('button', { name: /next|go on|create|league|season|division/i })
    .last();
  await page.getByLabel('Name of the league').fill('Harbour Netball');
  await next.click();
  await page.getByLabel('Name of the season').fill('Spring 2027');
  await page.getByLabel('Sport').fill('netball');
  await next.click();
  await page.getByLabel('Name of the division').fill('Under 13');
  await next.click();
  await page.getByLabel('E-mail addresses of team managers').fill('mate@harbour.example');
  await next.click();
  await page.waitForURL(/\/harbour-netball\/spring-2027\/readiness/);
  await expect(page.getByRole('heading', { name: 'Readiness', level: 1 })).toBeVisible();
  await readLink(request, 'mate@harbour.example', /http\S+\/join\/\S+/);
  expect(errors).toEqual([]);
});
