/** Sends text as a download while it is made, piece by piece; a reader who leaves ends the making. */
export function streamText(
  pieces: AsyncGenerator<string>,
  file: { name: string; mediaType: string },
): Response {
  const encoder = new TextEncoder();
  const body = new ReadableStream<Uint8Array>({
    async pull(controller) {
      const { value, done } = await pieces.next();
      if (done) controller.close();
      else controller.enqueue(encoder.encode(value));
    },
    async cancel() {
      await pieces.return(undefined);
    },
  });
  return new Response(body, {
    headers: {
      'content-type': file.mediaType,
      'content-disposition': `attachment; filename="${file.name.replace(/[^\w.-]/g, '_')}"`,
      'cache-control': 'private, no-store',
    },
  });
}
