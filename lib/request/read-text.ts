import 'server-only';

/** A short body as text; null as soon as it is longer than may be, so that nothing beyond is held in memory. */
export async function readText(request: Request, bytesMax: number): Promise<string | null> {
  if (Number(request.headers.get('content-length') ?? 0) > bytesMax) return null;
  const decoder = new TextDecoder();
  const reader = request.body?.getReader();
  let [text, bytes] = ['', 0];
  for (let read = await reader?.read(); read && !read.done; read = await reader?.read()) {
    bytes += read.value.length;
    if (bytes > bytesMax) {
      await reader?.cancel();
      return null;
    }
    text += decoder.decode(read.value, { stream: true });
  }
  return text + decoder.decode();
}
