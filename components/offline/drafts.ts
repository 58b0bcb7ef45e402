import { deleteDB, type IDBPDatabase, openDB } from 'idb';

const nameOf = (userId: string) => `ruckle-drafts-${userId}`;
const STORE = 'drafts';

/** Keys that begin so hold nothing that waits: only the way back. */
export const KEPT_FOR_UNDO = 'undo ';
const open = new Map<string, Promise<IDBPDatabase>>();

function database(userId: string): Promise<IDBPDatabase> {
  const had = open.get(userId);
  if (had) return had;
  const made = openDB(nameOf(userId), 1, {
    upgrade: (db) => void db.createObjectStore(STORE),
    // Signing out in another tab erases these drafts; a connection held here would keep them.
    blocking: (_now, _wanted, event) => {
      (event.target as IDBDatabase).close();
      open.delete(userId);
    },
  });
  open.set(userId, made);
  return made;
}

/** What a person wrote and the server has not acknowledged, kept on this device for that person only. */
export async function readDraft<T>(userId: string, key: string): Promise<T | null> {
  return ((await (await database(userId)).get(STORE, key)) as T | undefined) ?? null;
}

/** Null takes the draft away. */
export async function writeDraft(userId: string, key: string, draft: unknown): Promise<void> {
  const db = await database(userId);
  if (draft === null) await db.delete(STORE, key);
  else await db.put(STORE, draft, key);
}

/** All drafts whose key begins so, with the rest of their keys. */
export async function listDrafts<T>(userId: string, prefix: string): Promise<{ rest: string; draft: T }[]> {
  const range = IDBKeyRange.bound(prefix, `${prefix}\uffff`);
  const db = await database(userId);
  const [keys, drafts] = await Promise.all([db.getAllKeys(STORE, range), db.getAll(STORE, range)]);
  return keys.map((key, i) => ({ rest: String(key).slice(prefix.length), draft: drafts[i] as T }));
}

export async function countDrafts(userId: string): Promise<number> {
  const keys = await (await database(userId)).getAllKeys(STORE);
  return keys.filter((key) => !String(key).startsWith(KEPT_FOR_UNDO)).length;
}

/** At sign-out, after a warning that counts them. */
export async function wipeDrafts(userId: string): Promise<void> {
  const db = await open.get(userId);
  db?.close();
  open.delete(userId);
  await deleteDB(nameOf(userId));
}
