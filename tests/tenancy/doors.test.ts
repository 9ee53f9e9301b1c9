import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';

// Reads the source: every way into the application must go through one of the few doors that authorise.

const files = readdirSync('app', { recursive: true, encoding: 'utf8' }).map((file) =>
  file.split(path.sep).join('/'),
);
const read = (file: string): string => readFileSync(path.join('app', file), 'utf8');

/** Routes that are no doors of ours, each with the reason. */
const ownDoors: Record<string, string> = {
  'api/auth/[...nextauth]/route.ts': 'next-auth brings its own parsing and CSRF token',
  'api/health/route.ts': 'says only that the process runs',
  'api/ready/route.ts': 'says only which part of the installation is not ready',
};

describe('every way in', () => {
  it('of a route handler is defineRoute, which finds out who asks, parses and answers errors as problems', () => {
    const routes = files.filter((file) => file.endsWith('/route.ts') && !(file in ownDoors));
    expect(routes.length).toBeGreaterThan(8);
    for (const file of routes) {
      const exported = [
        ...read(file).matchAll(/export (?:const|async function|function) (GET|POST|PUT|PATCH|DELETE)\b(.*)/g),
      ];
      expect([
        file,
        exported.length > 0 && exported.every((match) => match[2]?.includes('defineRoute(')),
      ]).toEqual([file, true]);
    }
  });

  it('of a league’s route handler asks for the league, never for the public', () => {
    for (const file of files.filter(
      (entry) => entry.startsWith('api/v1/leagues/') && entry.endsWith('/route.ts'),
    )) {
      expect([file, /access: 'league'/.test(read(file))]).toEqual([file, true]);
    }
  });

  it('of a server action is one of the three wrappers', () => {
    const actions = files.filter((file) => /^'use server'/m.test(/\.tsx?$/.test(file) ? read(file) : ''));
    expect(actions.length).toBeGreaterThan(8);
    for (const file of actions) {
      const source = read(file);
      const exported = [...source.matchAll(/export (?:const|async function|function) (\w+)([^\n]*)/g)];
      const open = exported.filter((match) => !/= (league|person|public)Action\(/.test(match[2] ?? ''));
      expect([file, open.map((match) => match[1])]).toEqual([file, []]);
    }
  });

  it('of a server action is in a file of actions: none hides inside a page or a component', () => {
    for (const file of files.filter((entry) => /\.tsx?$/.test(entry))) {
      const inside = /^[^\S\n]+['"]use server['"]|^"use server"/m.test(read(file));
      const elsewhere = /^'use server'/m.test(read(file)) && !file.endsWith('/actions.ts');
      expect([file, inside, elsewhere]).toEqual([file, false, false]);
    }
  });

  it('by a page is behind the sign-in, or on this list', () => {
    const open = files.filter(
      (file) => /(^|\/)page\.tsx$/.test(file) && !/await require(League|Person)\(/.test(read(file)),
    );
    expect(open.filter((file) => !file.startsWith('(public)/'))).toEqual(['inbox/page.tsx']);
    // The inbox of a trial installation shows letters that never left the machine; elsewhere it does not exist.
    expect(read('inbox/page.tsx')).toContain('showNotFound(listInbox())');
  });

  it('of a page behind the sign-in asks who is there, in the page itself and not only in a layout', () => {
    const pages = files.filter((file) =>
      /^(\[league\]|shop|match|account|leagues)\/.*page\.tsx$|^(shop|match|account|leagues)\/page\.tsx$/.test(
        file,
      ),
    );
    expect(pages.length).toBeGreaterThan(20);
    for (const file of pages) {
      expect([file, /await require(League|Person)\(/.test(read(file))]).toEqual([file, true]);
    }
  });

  it('of anything in app never touches the database itself', () => {
    for (const file of files.filter((entry) => /\.tsx?$/.test(entry))) {
      expect([file, /from '@\/db\//.test(read(file))]).toEqual([file, false]);
    }
  });
});
