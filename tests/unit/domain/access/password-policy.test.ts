import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findPasswordFault } from '@/lib/domain/access/password-policy';

const email = 'maren.tidewell@club.example';

describe('what may be a password', () => {
  it.each([
    'four quiet herons wade',
    'ÆØÅ bridge café',
    'correcthorse99battery',
    '鷺が四羽静かに歩いている',
    'x7!kd03mQz',
  ])('takes %s', (password) => expect(findPasswordFault(password, email)).toBeNull());

  it.each([
    ['nine char', 'at least 10'],
    ['👍👍👍👍👍👍', 'at least 10'],
    ['Maren.Tidewell@club.example', 'own address'],
    ['maren.tidewell2027', 'own address'],
    ['aaaaaaaaaaaa', 'over and over'],
    ['abcabcabcabc', 'over and over'],
    ['12121212121', 'over and over'],
    ['1234567890', 'in a row'],
    ['qwertyuiop', 'in a row'],
    ['Password2027!', 'try first'],
    ['!!PASSWORD!!', 'try first'],
    ['basketball1', 'try first'],
    ['passwordpassword', 'try first'],
    ['y'.repeat(100) + 'zk'.repeat(51), 'at most 200'],
  ])('refuses %s and says why: %s', (password, says) => {
    expect(findPasswordFault(password, email)).toContain(says);
  });

  it('counts a character outside the first plane once', () => {
    expect(findPasswordFault('👍👎✊👋🖐️🤞🤟🤘🤙👌', email)).toBeNull();
  });

  it('asks for no kind of character: any ten different letters out of order will do', () => {
    fc.assert(
      fc.property(fc.shuffledSubarray([...'bdfhjlnprtvxz'], { minLength: 10 }), (letters) => {
        expect(findPasswordFault(letters.join(''), email)).toBeNull();
      }),
    );
  });

  it('never throws, whatever is typed', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 300 }), fc.string(), (password, address) => {
        const fault = findPasswordFault(password, address);
        expect(fault === null || fault.endsWith('.')).toBe(true);
      }),
    );
  });
});
