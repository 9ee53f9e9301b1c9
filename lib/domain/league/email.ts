/** Every e-mail the product sends, with what it needs to be written. The text itself is in lib/platform/mail. */
export type OutgoingEmail =
  | {
      template: 'invitation';
      params: { league: string; role: string; invitedBy: string; link: string; expires: string };
    }
  | { template: 'password-reset'; params: { link: string; expires: string } }
  | {
      template: 'roster-reminder';
      params: { league: string; team: string; freezes: string; holds: string; link: string };
    }
  | { template: 'roster-returned'; params: { league: string; team: string; reason: string; link: string } }
  | { template: 'roster-signed-off'; params: { league: string; team: string; link: string } }
  | { template: 'batch-released'; params: { league: string; batch: string; teams: string; link: string } };
