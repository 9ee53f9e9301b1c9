import { AppError } from '@/lib/platform/errors';

/** The body of a request as bytes, but never more than `most`, whatever the request says of its own length. */
export async function readBytes(request: Request, most: number): Promise<Uint8Array> {
  const tooLarge = () =>
    new AppError(
      'too-large',
      `The file is over ${Math.floor(most / 1024 / 1024)} MB. Bring in a smaller one.`,
    );
  if (Number(request.headers.get('content-length') ?? 0) > most) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let total = 0;
  for await (const chunk of request.body ?? []) {
    total += chunk.byteLength;
    if (total > most) throw tooLarge();
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
}
