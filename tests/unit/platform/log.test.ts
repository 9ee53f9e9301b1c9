import { describe, expect, it } from 'vitest';
import { describeError } from '@/lib/platform/log';

describe('an error in the log', () => {
  it('keeps code and place of what the database refused, and nothing that it quotes of the row', () => {
    const quoted = 'Failing row contains (Calloway, Ines, 14).';
    const error = Object.assign(new Error(`violates check constraint. ${quoted}`), {
      code: '23514',
      table: 'players',
      constraint: 'players_name_length',
      detail: quoted,
      where: quoted,
    });
    const said = describeError(error);
    expect(said).toMatchObject({ code: '23514', table: 'players', constraint: 'players_name_length' });
    expect(said['stack']).toMatch(/log\.test/);
    expect(JSON.stringify(said)).not.toMatch(/Calloway/);
  });

  it('keeps the words of every other error', () => {
    const error = Object.assign(new Error('connect refused'), { code: 'EPIPE' });
    expect(describeError(error)).toMatchObject({ message: 'connect refused', code: 'EPIPE' });
  });
});
