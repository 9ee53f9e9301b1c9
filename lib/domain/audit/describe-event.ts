import { countOf } from '../text/count-of';
import { formatBytes } from '../text/format-bytes';
import { joinWords } from '../text/sentence';
import type { AuditEvent, Difference, RosterChange } from './event';

/**
 * What happened, as the rest of a sentence that starts with whoever did it: "signed off the roster of Otters with 12
 * players". An event of a type this version does not know is told by its type.
 */
export function describeEvent(event: AuditEvent): string {
  switch (event.type) {
    case 'league created':
      return `created the league ${event.data.name}`;
    case 'league changed':
      return `changed the league's settings: ${listFields(event.data.changes)}`;
    case 'person invited':
      return `invited ${event.data.email} as ${event.data.role}`;
    case 'invitation sent again':
      return `sent the invitation of ${event.data.email} as ${event.data.role} again`;
    case 'invitation withdrawn':
      return `withdrew the invitation of ${event.data.email} as ${event.data.role}`;
    case 'invitation accepted':
      return `joined as ${event.data.role}`;
    case 'manager teams changed':
      return describeTeams(event.data);
    case 'membership ended':
      return `ended the membership of ${event.data.person} as ${event.data.role}`;
    case 'shop added':
      return `added the shop ${event.data.name}`;
    case 'season opened':
      return `opened the season ${event.data.name}`;
    case 'season changed':
      return `changed the season ${event.data.name}: ${listFields(event.data.changes)}`;
    case 'division added':
      return `added the division ${event.data.name}`;
    case 'division changed':
      return `changed the division ${event.data.name}: ${listFields(event.data.changes)}`;
    case 'division removed':
      return `removed the division ${event.data.name}`;
    case 'team added':
      return `added the team ${event.data.name}`;
    case 'team changed':
      return `changed the team ${event.data.name}: ${listFields(event.data.changes)}`;
    case 'team removed':
      return `removed the team ${event.data.name} with ${countOf(event.data.players, 'player')}`;
    case 'teams imported':
      return `imported teams: ${listCounts(event.data)}`;
    case 'rule set started': {
      const { name, preset } = event.data;
      return `started the number rules ${name}${preset === null ? '' : ` from ${preset}`}`;
    }
    case 'rule set drafted':
      return `drafted version ${event.data.version} of the number rules ${event.data.name}`;
    case 'rule set draft discarded':
      return `discarded the draft of version ${event.data.version} of the number rules ${event.data.name}`;
    case 'rule set put in force':
      return `put version ${event.data.version} of the number rules ${event.data.name} in force`;
    case 'roster edited':
      return `edited the roster of ${event.data.team}: ${describeRosterChanges(event.data.changes)}`;
    case 'roster imported': {
      const { team, ...counts } = event.data;
      return `imported players into the roster of ${team}: ${listCounts(counts)}`;
    }
    case 'roster submitted':
      return `submitted the roster of ${event.data.team} with ${countOf(event.data.players, 'player')}`;
    case 'roster withdrawn':
      return `took the roster of ${event.data.team} back`;
    case 'roster returned':
      return `returned the roster of ${event.data.team}: ${event.data.reason}`;
    case 'roster signed off':
      return `signed off the roster of ${event.data.team} with ${countOf(event.data.players, 'player')}`;
    case 'roster reopened':
      return `reopened the roster of ${event.data.team}: ${event.data.reason}`;
    case 'roster frozen': {
      const because = { date: ' on its date', batch: ' with its batch', person: '' }[event.data.because];
      return `froze the roster of ${event.data.team}${because}`;
    }
    case 'managers reminded':
      return `reminded ${countOf(event.data.people, 'manager')} of ${countOf(event.data.teams, 'team')}`;
    case 'batch held':
      return `made batch ${event.data.code} of ${countOf(event.data.teams, 'team')}`;
    case 'batch changed':
      return `changed batch ${event.data.code}: ${listFields(event.data.changes)}`;
    case 'batch discarded':
      return `discarded batch ${event.data.code}`;
    case 'batch released': {
      const { code, teams, players } = event.data;
      return `released batch ${code} of ${countOf(teams, 'team')} and ${countOf(players, 'player')}`;
    }
    case 'batch marked':
      return `marked batch ${event.data.code} ${event.data.to}`;
    case 'bundle built': {
      const { code, files, bytes } = event.data;
      return `built the bundle of batch ${code}: ${countOf(files, 'file')}, ${formatBytes(bytes)}`;
    }
    case 'bundle queued again':
      return `had the bundle of batch ${event.data.code} made again`;
    case 'bundle downloaded':
      return `downloaded ${event.data.file} of batch ${event.data.code}`;
    default:
      return describeUnknown(event);
  }
}

// The compiler sees to it that every type of today has its sentence; a row written by a later version may not.
const describeUnknown = (event: never): string => (event as { type: string }).type;

function describeTeams(data: { person: string; added: string[]; removed: string[] }): string {
  const given = data.added.length > 0 && `named ${data.person} manager of ${joinWords(data.added)}`;
  const taken = data.removed.length > 0 && `took ${joinWords(data.removed)} from ${data.person}`;
  return joinWords([given, taken].filter((part) => part !== false));
}

/** The names of the fields that changed, as words: `freezesAt` is read "freezes at". */
const listFields = (changes: Difference): string => joinWords(Object.keys(changes).map(nameField));

/** A field's name as words. */
export const nameField = (field: string): string =>
  field.replace(/([a-z])([A-Z])/g, (_, end: string, start: string) => `${end} ${start.toLowerCase()}`);

const listCounts = (counts: Record<string, number>): string =>
  joinWords(Object.entries(counts).map(([word, count]) => `${count.toLocaleString('en')} ${word}`));

function describeRosterChanges(changes: readonly RosterChange[]): string {
  const count = (kind: RosterChange['kind']) => changes.filter((change) => change.kind === kind).length;
  const parts = [
    count('cell') > 0 && countOf(count('cell'), 'cell'),
    count('added') > 0 && `${countOf(count('added'), 'player')} added`,
    count('removed') > 0 && `${countOf(count('removed'), 'player')} removed`,
    count('moved') > 0 && `${countOf(count('moved'), 'player')} moved`,
  ].filter((part) => part !== false);
  return parts.length === 0 ? 'nothing' : joinWords(parts);
}

/** One value of an event before and after, as text; empty for none. */
export type ShownChange = { what: string; from: string; to: string };

/** The single changes an event holds, for whoever wants to see more than its sentence; empty when it holds none. */
export function listChanges(event: AuditEvent): ShownChange[] {
  const data: Record<string, unknown> = event.data;
  const changes = data['changes'];
  if (event.type === 'roster edited') return event.data.changes.map(showRosterChange);
  if (typeof changes !== 'object' || changes === null) return [];
  return Object.entries(changes as Difference).map(([field, { from, to }]) => ({
    what: nameField(field),
    from: showValue(from),
    to: showValue(to),
  }));
}

function showRosterChange(change: RosterChange): ShownChange {
  switch (change.kind) {
    case 'cell':
      return {
        what: change.field.startsWith('size:')
          ? `size of ${change.field.slice('size:'.length)}`
          : nameField(change.field),
        from: change.from,
        to: change.to,
      };
    case 'added':
      return { what: 'player added', from: '', to: '' };
    case 'removed':
      return { what: 'player removed', from: change.was, to: '' };
    case 'moved':
      return { what: 'player moved', from: '', to: '' };
  }
}

function showValue(value: unknown): string {
  if (value === null || value === undefined) return '';
  if (typeof value === 'string') return value;
  if (Array.isArray(value)) return value.map(showValue).join(', ');
  return typeof value === 'object' ? JSON.stringify(value) : String(value as number | boolean);
}
