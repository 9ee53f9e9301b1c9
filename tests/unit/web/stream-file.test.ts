import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isFirstRange, readRange, streamFile } from '@/lib/web/stream-file';

const data = new TextEncoder().encode('0123456789');
const file = {
  name: 'Pull list “Örtze”.csv',
  mediaType: 'text/csv',
  bytes: data.length,
  sha256: 'abc',
  async *read({ start, end }: { start: number; end: number }) {
    yield data.subarray(start, end + 1);
  },
};
const ask = (headers: Record<string, string>) => streamFile({ headers: new Headers(headers) }, file);

// RFC 9110, section 14: byte ranges, If-Range, 206 and 416.
describe('a download', () => {
  it('gives the whole file without a range', async () => {
    const response = ask({});
    expect([response.status, response.headers.get('x-body-bytes'), await response.text()]).toEqual([
      200,
      '10',
      '0123456789',
    ]);
  });

  it('gives exactly the bytes of a range, from the start, the end, or open', async () => {
    for (const [range, text, content] of [
      ['bytes=0-3', '0123', 'bytes 0-3/10'],
      ['bytes=7-', '789', 'bytes 7-9/10'],
      ['bytes=-2', '89', 'bytes 8-9/10'],
      ['bytes=8-99', '89', 'bytes 8-9/10'],
    ] as const) {
      const response = ask({ range });
      expect([response.status, await response.text(), response.headers.get('content-range')]).toEqual([
        206,
        text,
        content,
      ]);
    }
  });

  it('refuses a range past the end with the size, and gives the whole file for forms it does not serve', async () => {
    expect([
      ask({ range: 'bytes=10-' }).status,
      ask({ range: 'bytes=10-' }).headers.get('content-range'),
    ]).toEqual([416, 'bytes */10']);
    expect(ask({ range: 'bytes=0-1,4-5' }).status).toBe(200);
    expect(ask({ range: 'lines=1-2' }).status).toBe(200);
  });

  it('gives the whole file when If-Range names another version, and nothing when the browser has it already', () => {
    expect(ask({ range: 'bytes=0-3', 'if-range': '"old"' }).status).toBe(200);
    expect(ask({ range: 'bytes=0-3', 'if-range': '"abc"' }).status).toBe(206);
    expect(ask({ 'if-none-match': '"abc"' }).status).toBe(304);
  });

  it('is never kept in a shared cache, and keeps any letters of its name out of the header’s plain part', () => {
    const headers = ask({}).headers;
    expect(headers.get('cache-control')).toContain('private');
    expect(headers.get('content-disposition')).toMatch(/filename="[\w.-]+"; filename\*=UTF-8''Pull%20list/);
  });

  it('joined from any two adjoining ranges is the whole file', async () => {
    await fc.assert(
      fc.asyncProperty(fc.integer({ min: 1, max: 9 }), async (cut) => {
        const first = await ask({ range: `bytes=0-${cut - 1}` }).text();
        const second = await ask({ range: `bytes=${cut}-` }).text();
        expect(first + second).toBe('0123456789');
      }),
    );
  });

  it('counts as begun by every request but one that plainly asks for a further piece', () => {
    const begins = (range?: string) => isFirstRange(new Headers(range === undefined ? {} : { range }));
    for (const range of [
      undefined,
      '',
      'bytes=0-',
      'bytes=0-5',
      'bytes=-99999',
      'bytes= 0-',
      'items=0-5',
      'bytes=5-6,8-9',
    ])
      expect(begins(range), range).toBe(true);
    for (const range of ['bytes=1-', 'bytes=500-999']) expect(begins(range), range).toBe(false);
  });

  it('reads any header without throwing', () => {
    fc.assert(
      fc.property(fc.string(), fc.nat(100), (text, bytes) => {
        const headers = { get: (name: string) => (name === 'range' ? text : null) } as unknown as Headers;
        const range = readRange(headers, bytes, '"x"');
        if (range !== null && range !== 'unsatisfiable')
          expect(range.start <= range.end && range.end < bytes).toBe(true);
      }),
    );
  });
});
