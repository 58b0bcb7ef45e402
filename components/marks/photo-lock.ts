const nameOf = (photoId: string) => `marks ${photoId}`;
// Absent where the page came over plain http from another machine; there a second tab is on its own.
const locks = () => ('locks' in navigator ? navigator.locks : null);

/** Says to other tabs that this photo's marks are in hand here. @returns what says that they are no longer */
export function holdPhoto(photoId: string): () => void {
  const done = new AbortController();
  const held = new Promise<void>((resolve) => done.signal.addEventListener('abort', () => resolve()));
  void locks()?.request(nameOf(photoId), { mode: 'shared' }, () => held);
  return () => done.abort();
}

/** Does it unless the photo's marks are in hand somewhere: that one sends them itself. */
export async function ifNobodyHolds(photoId: string, task: () => Promise<void>): Promise<void> {
  const manager = locks();
  if (!manager) return task();
  await manager.request(nameOf(photoId), { ifAvailable: true }, (lock) => (lock ? task() : undefined));
}
