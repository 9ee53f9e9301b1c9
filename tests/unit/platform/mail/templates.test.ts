import { describe, expect, it } from 'vitest';
import { outgoingEmailSchema, type OutgoingEmail } from '@/lib/domain/league/email';
import { writeEmail } from '@/lib/platform/mail/templates';

/** One letter of each template, every parameter given as its own name. */
const letters = outgoingEmailSchema.options.map((option) =>
  outgoingEmailSchema.parse({
    template: option.shape.template.value,
    params: Object.fromEntries(Object.keys(option.shape.params.shape).map((name) => [name, `the-${name}`])),
  }),
);

const invitation = (league: string): OutgoingEmail => ({
  template: 'invitation',
  params: {
    league,
    role: 'team manager',
    teams: 'Otters and Herons',
    invitedBy: 'Maren Tidewell',
    link: 'http://localhost:3000/join/abc_-1',
    expires: 'until Tuesday 15 December at 12:00',
  },
});

describe('letters', () => {
  it.each(letters)('$template has a subject and puts every parameter into words', (letter) => {
    const { subject, text, html } = writeEmail(letter);
    expect(subject).not.toBe('');
    for (const value of Object.values(letter.params)) {
      expect(text).toContain(value);
      expect(html).toContain(value);
    }
  });

  it.each(letters)('$template carries nothing that tells whether it was read', (letter) => {
    expect(writeEmail(letter).html).not.toMatch(/<(img|script|iframe|link|style)|\bsrc=|url\(/i);
  });

  it('escapes what people wrote', () => {
    const { html, text } = writeEmail(invitation('<b onclick="x">Tern\'s & Co</b>'));
    expect(html).not.toMatch(/<b[\s>]/);
    expect(html).toContain('&lt;b onclick=&quot;x&quot;&gt;Tern&#39;s &amp; Co&lt;/b&gt;');
    expect(text).toContain('<b onclick="x">Tern\'s & Co</b>');
  });

  it('keeps a subject on one line', () => {
    expect(writeEmail(invitation('Tern\r\nBcc: other@club.example')).subject).not.toMatch(/[\r\n]/);
  });

  it('gives the link whole on a line of its own in plain text', () => {
    expect(writeEmail(invitation('Tern')).text.split('\n')).toContain('http://localhost:3000/join/abc_-1');
  });

  it('says one team as one', () => {
    const params = { league: 'Tern', batch: 'B-07', link: 'http://localhost:3000/shop' };
    const written = (teams: string) =>
      writeEmail({ template: 'batch-released', params: { ...params, teams } }).text;
    expect(written('1')).toContain('1 team.');
    expect(written('19')).toContain('19 teams.');
  });
});
