import 'server-only';

/** The whole body, or null as soon as it is longer than may be: nothing beyond is read into memory. */
export async function readBody(request: Request, bytesMax: number): Promise<Buffer | null> {
  if (Number(request.headers.get('content-length') ?? 0) > bytesMax) return null;
  if (!request.body) return Buffer.alloc(0);
  const chunks: Uint8Array[] = [];
  let bytes = 0;
  const reader = request.body.getReader();
  for (let read = await reader.read(); !read.done; read = await reader.read()) {
    bytes += read.value.length;
    if (bytes > bytesMax) {
      await reader.cancel();
      return null;
    }
    chunks.push(read.value);
  }
  return Buffer.concat(chunks);
}
