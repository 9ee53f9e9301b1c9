import type { OutgoingEmail } from '@/lib/domain/league/email';

/** A paragraph, or a link on a line of its own. */
type Block = string | { link: string; says: string };
type Letter = { subject: string; blocks: Block[] };

export type WrittenEmail = { subject: string; text: string; html: string };

/**
 * Writes an e-mail as plain text and as the same words in HTML. Everything that came from a person is escaped; there
 * are no pictures, no styles to speak of and nothing that tells anybody whether it was read.
 */
export function writeEmail(email: OutgoingEmail): WrittenEmail {
  const { subject, blocks } = compose(email);
  const all = [...blocks, 'Raglan, the kit plan of your league. This address takes no answers.'];
  return {
    subject: oneLine(subject),
    text: `${all.map((block) => (typeof block === 'string' ? block : `${block.says}:\n${block.link}`)).join('\n\n')}\n`,
    html: `<!doctype html><html lang="en"><body>${all.map(writeBlock).join('')}</body></html>`,
  };
}

const writeBlock = (block: Block): string =>
  typeof block === 'string'
    ? `<p>${escapeHtml(block).replaceAll('\n', '<br>')}</p>`
    : `<p><a href="${escapeHtml(block.link)}">${escapeHtml(block.says)}</a><br>${escapeHtml(block.link)}</p>`;

const escapeHtml = (text: string): string =>
  text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
    .replaceAll("'", '&#39;');

/** A subject is one line: a line break in a league's name must not start a header of its own. */
const oneLine = (text: string): string => text.replace(/[\s\p{Cc}]+/gu, ' ').trim();

function compose(email: OutgoingEmail): Letter {
  switch (email.template) {
    case 'invitation': {
      const { league, role, teams, invitedBy, link, expires } = email.params;
      const what = teams === '' ? `as ${role}` : `as ${role} of ${teams}`;
      return {
        subject: `${league} invites you as ${role}`,
        blocks: [
          `${invitedBy} invites you to ${league} ${what}. Raglan is where the league keeps its teams, rosters and kit.`,
          { says: 'Accept the invitation', link },
          `The link works once, ${expires}. If you do not know ${league}, do nothing: no account is made.`,
        ],
      };
    }
    case 'teams-added': {
      const { league, teams, addedBy, link } = email.params;
      return {
        subject: `You now look after ${teams} in ${league}`,
        blocks: [
          `${addedBy} has named you team manager of ${teams} in ${league}.`,
          { says: 'Open the league', link },
        ],
      };
    }
    case 'sign-up': {
      const { link, expires } = email.params;
      return {
        subject: 'Confirm your address to set up your account',
        blocks: [
          'Somebody, we hope you, asked for a Raglan account with this address.',
          { says: 'Choose a password and open the account', link },
          `The link works once, ${expires}. If it was not you, do nothing: no account is made.`,
        ],
      };
    }
    case 'sign-up-known': {
      const { signInLink, resetLink } = email.params;
      return {
        subject: 'You have a Raglan account already',
        blocks: [
          'Somebody, we hope you, asked for a Raglan account with this address. There is one already, so nothing was changed.',
          { says: 'Sign in', link: signInLink },
          { says: 'Set a new password', link: resetLink },
          'If it was not you, you need do nothing.',
        ],
      };
    }
    case 'password-reset': {
      const { link, expires } = email.params;
      return {
        subject: 'Set a new password',
        blocks: [
          'Somebody, we hope you, asked to set a new password for the Raglan account of this address.',
          { says: 'Set a new password', link },
          `The link works once, ${expires}. If it was not you, do nothing: your password stays as it is.`,
        ],
      };
    }
    case 'password-changed':
      return {
        subject: 'Your password was changed',
        blocks: [
          'The password of your Raglan account was changed, and you were signed out everywhere.',
          'If it was not you, set a new password at once and tell your league admin.',
          { says: 'Set a new password', link: email.params.resetLink },
        ],
      };
    case 'roster-reminder': {
      const { league, team, freezes, holds, link } = email.params;
      return {
        subject: `The roster of ${team} freezes ${freezes}`,
        blocks: [
          `Rosters of ${league} freeze ${freezes}. What still holds ${team}: ${holds}`,
          { says: `Open the roster of ${team}`, link },
        ],
      };
    }
    case 'roster-returned': {
      const { league, team, reason, link } = email.params;
      return {
        subject: `The roster of ${team} came back`,
        blocks: [
          `${league} has returned the roster of ${team}. The reason given:`,
          reason,
          { says: `Open the roster of ${team}`, link },
        ],
      };
    }
    case 'roster-signed-off': {
      const { league, team, link } = email.params;
      return {
        subject: `The roster of ${team} is signed off`,
        blocks: [
          `${league} has signed off the roster of ${team}. Names, numbers and sizes go to the decorator as they stand.`,
          { says: `Look at the roster of ${team}`, link },
        ],
      };
    }
    case 'batch-released': {
      const { league, batch, teams, link } = email.params;
      return {
        subject: `Batch ${batch} of ${league} is released to you`,
        blocks: [
          `${league} has released batch ${batch} to you, with ${teams === '1' ? '1 team' : `${teams} teams`}. The bundle has every list, label and piece.`,
          { says: `Open batch ${batch}`, link },
        ],
      };
    }
  }
}
