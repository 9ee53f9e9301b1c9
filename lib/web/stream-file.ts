import type { OpenFile } from '@/lib/use-cases/batches/open-bundle-file';

type Range = { start: number; end: number };

/**
 * The single byte range a request asks for (RFC 9110, section 14): the range, null for the whole file (no header, a
 * form this server does not serve, or an `If-Range` that names another version), or `unsatisfiable`.
 */
export function readRange(headers: Headers, bytes: number, etag: string): Range | null | 'unsatisfiable' {
  const header = headers.get('range');
  if (header === null) return null;
  const ifRange = headers.get('if-range');
  if (ifRange !== null && ifRange !== etag) return null;
  const match = /^bytes=(\d*)-(\d*)$/.exec(header.trim());
  if (!match || (match[1] === '' && match[2] === '')) return null;
  if (match[1] === '') {
    const length = Math.min(Number(match[2]), bytes);
    return length === 0 ? 'unsatisfiable' : { start: bytes - length, end: bytes - 1 };
  }
  const start = Number(match[1]);
  const end = match[2] === '' ? bytes - 1 : Math.min(Number(match[2]), bytes - 1);
  if (match[2] !== '' && Number(match[2]) < start) return null;
  return start >= bytes ? 'unsatisfiable' : { start, end };
}

/** Whether a request may start a download: all but those that ask for a piece from further on, and say so plainly. */
export const isFirstRange = (headers: Headers): boolean =>
  !/^bytes=[1-9]\d*-\d*$/.test(headers.get('range')?.trim() ?? '');

/** Streams an opened file as a download, whole or the range that was asked for; unchanged files answer 304. */
export function streamFile(request: { headers: Headers }, file: OpenFile): Response {
  const etag = `"${file.sha256}"`;
  const headers = new Headers({
    'accept-ranges': 'bytes',
    etag,
    'content-type': file.mediaType,
    'content-disposition': `attachment; filename="${file.name.replace(/[^\w.-]/g, '_')}"; filename*=UTF-8''${encodeURIComponent(file.name)}`,
    // Names of children: never in a shared cache, and never kept by the browser without asking again.
    // And never compressed on the way, since ranges count the bytes of the file itself.
    'cache-control': 'private, no-cache, no-transform',
  });
  if (request.headers.get('if-none-match') === etag) return new Response(null, { status: 304, headers });
  const range = readRange(request.headers, file.bytes, etag);
  if (range === 'unsatisfiable') {
    headers.set('content-range', `bytes */${file.bytes}`);
    return new Response(null, { status: 416, headers });
  }
  const { start, end } = range ?? { start: 0, end: file.bytes - 1 };
  // scripts/web.mjs turns this into Content-Length, which Next would drop.
  headers.set('x-body-bytes', String(end - start + 1));
  if (range) headers.set('content-range', `bytes ${start}-${end}/${file.bytes}`);
  const source = file.read({ start, end });
  const body = new ReadableStream<Uint8Array>({
    async pull(controller) {
      const { value, done } = await source.next();
      if (done) controller.close();
      else controller.enqueue(value);
    },
    async cancel() {
      await source.return(undefined);
    },
  });
  return new Response(body, { status: range ? 206 : 200, headers });
}
