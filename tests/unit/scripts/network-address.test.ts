import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readNetwork } from '../../../scripts/network-address.mjs';

describe('the network a request comes from', () => {
  it('is an IPv4 address whole, also when it is written as IPv6', () => {
    expect(readNetwork('203.0.113.9')).toBe('203.0.113.9');
    expect(readNetwork('::ffff:203.0.113.9')).toBe('203.0.113.9');
  });

  it('is the first 64 bits of an IPv6 address, however it is written', () => {
    const network = '2001:db8:0:7::/64';
    for (const address of [
      '2001:db8:0:7::1',
      '2001:DB8::7:1:2:3:4',
      '[2001:db8:0:7::9]',
      '2001:db8:0:7::1%eth0',
    ])
      expect(readNetwork(address)).toBe(network);
    expect(readNetwork('::1')).toBe('0:0:0:0::/64');
  });

  it('is the same for every address of one line, and another for the next line', () => {
    const group = fc.integer({ min: 0, max: 0xffff }).map((value) => value.toString(16));
    const four = fc.tuple(group, group, group, group).map((groups) => groups.join(':'));
    fc.assert(
      fc.property(four, four, four, four, (line, other, a, b) => {
        expect(readNetwork(`${line}:${a}`)).toBe(readNetwork(`${line}:${b}`));
        if (line !== other) expect(readNetwork(`${line}:${a}`)).not.toBe(readNetwork(`${other}:${a}`));
      }),
    );
  });

  it('stays as it is when it is no address', () => {
    expect(readNetwork('unknown')).toBe('unknown');
    expect(readNetwork('a:b')).toBe('a:b');
  });
});
