// A mail server for demonstrations and tests: takes every message, delivers none, and shows them as JSON.
import { createServer, type ServerResponse } from 'node:http';
import type { AddressInfo, Server } from 'node:net';
import { simpleParser, type AddressObject } from 'mailparser';
import { SMTPServer } from 'smtp-server';

/** One message as it arrived; `at` is the instant of arrival, ISO 8601. */
export type CaughtMessage = {
  id: string;
  at: string;
  from: string;
  to: string[];
  subject: string;
  text: string;
  html: string | null;
};

export type MailServer = {
  smtpUrl: string;
  inboxUrl: string;
  /** Newest first. */
  listMessages: () => CaughtMessage[];
  /** Resolves with the next message for which `wanted` holds, also if it is here already. */
  waitForMessage: (wanted: (message: CaughtMessage) => boolean) => Promise<CaughtMessage>;
  clear: () => void;
  close: () => Promise<void>;
};

/** What a demonstration can need; older messages make room. */
const mostMessages = 200;
/** Addresses whose mail is refused, so that the way of a bounce can be seen: anything at this domain. */
const refusedDomain = 'refused.example';

const listAddresses = (field: AddressObject | AddressObject[] | undefined): string[] =>
  (Array.isArray(field) ? field : field ? [field] : []).flatMap((entry) =>
    entry.value.flatMap((address) => address.address ?? []),
  );

const listen = (server: Server, port: number) =>
  new Promise<void>((resolve) => {
    server.listen(port, '127.0.0.1', () => resolve());
  });

/** Starts both halves on 127.0.0.1; port 0 takes a free one. */
export async function startMailServer(ports: { smtp: number; http: number }): Promise<MailServer> {
  let messages: CaughtMessage[] = [];
  let count = 0;
  const waiting = new Set<(message: CaughtMessage) => void>();

  const smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    size: 5_000_000,
    disableReverseLookup: true,
    onRcptTo({ address }, _session, done) {
      if (!address.toLowerCase().endsWith(`@${refusedDomain}`)) return done();
      done(Object.assign(new Error('No such mailbox here'), { responseCode: 550 }));
    },
    onData(stream, session, done) {
      simpleParser(stream).then((mail) => {
        count += 1;
        const named = listAddresses(mail.to);
        const message: CaughtMessage = {
          id: String(count),
          at: new Date().toISOString(),
          from: mail.from?.text ?? '',
          to: named.length > 0 ? named : session.envelope.rcptTo.map((recipient) => recipient.address),
          subject: mail.subject ?? '',
          text: mail.text ?? '',
          html: mail.html || null,
        };
        messages = [message, ...messages].slice(0, mostMessages);
        for (const notice of waiting) notice(message);
        done();
      }, done);
    },
  });
  smtp.on('error', () => {}); // a client that hangs up in mid-sentence is no reason to end

  const answer = (response: ServerResponse, status: number, body: unknown) => {
    response.writeHead(status, { 'content-type': 'application/json', 'cache-control': 'no-store' });
    response.end(JSON.stringify(body));
  };
  const http = createServer((request, response) => {
    const id = /^\/messages\/(\d+)$/.exec(request.url ?? '')?.[1];
    if (request.url === '/messages' && request.method === 'GET') {
      answer(response, 200, messages);
    } else if (request.url === '/messages' && request.method === 'DELETE') {
      messages = [];
      answer(response, 200, []);
    } else if (id !== undefined && request.method === 'GET') {
      const message = messages.find((entry) => entry.id === id);
      if (message) answer(response, 200, message);
      else answer(response, 404, { title: 'No such message.' });
    } else {
      answer(response, 404, { title: 'Ask for /messages or /messages/ID.' });
    }
  });

  await Promise.all([listen(smtp.server, ports.smtp), listen(http, ports.http)]);
  const portOf = (server: Server) => (server.address() as AddressInfo).port;
  return {
    smtpUrl: `smtp://127.0.0.1:${portOf(smtp.server)}`,
    inboxUrl: `http://127.0.0.1:${portOf(http)}`,
    listMessages: () => messages,
    waitForMessage: (wanted) =>
      new Promise((resolve) => {
        const here = messages.find(wanted);
        if (here) return resolve(here);
        const notice = (message: CaughtMessage) => {
          if (!wanted(message)) return;
          waiting.delete(notice);
          resolve(message);
        };
        waiting.add(notice);
      }),
    clear: () => {
      messages = [];
    },
    close: async () => {
      http.closeAllConnections();
      await Promise.all([
        new Promise<void>((resolve) => smtp.close(() => resolve())),
        new Promise<void>((resolve) => http.close(() => resolve())),
      ]);
    },
  };
}
