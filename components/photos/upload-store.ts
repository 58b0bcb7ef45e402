import { deleteDB, type DBSchema, type IDBPDatabase, openDB } from 'idb';
import type { View } from '@/diagnosis/garments/schema';

/** A photo that waits on this device until the server has it. The key is also the server's: the same upload twice is one photo. */
export interface WaitingUpload {
  key: string;
  roundId: string;
  name: string;
  view: View;
  isMirrored: boolean;
  file: Blob;
  /** Made small and upright already; before that, `file` is what was chosen. */
  isPrepared: boolean;
}

interface Uploads extends DBSchema {
  uploads: { key: string; value: WaitingUpload; indexes: { round: string } };
}

const nameOf = (userId: string) => `ruckle-uploads-${userId}`;
const open = new Map<string, Promise<IDBPDatabase<Uploads>>>();

/** What the device would not keep (a private window, no space left): it goes out all the same while the page is open. */
const unkept = new Map<string, WaitingUpload & { userId: string }>();

function database(userId: string): Promise<IDBPDatabase<Uploads>> {
  const had = open.get(userId);
  if (had) return had;
  const letGo = () => void open.delete(userId);
  const opening = async () =>
    openDB<Uploads>(nameOf(userId), 1, {
      upgrade: (db) =>
        void db.createObjectStore('uploads', { keyPath: 'key' }).createIndex('round', 'roundId'),
      // Signing out in another tab erases these files; a connection held here would keep them.
      blocking: (_now, _wanted, event) => {
        (event.target as IDBDatabase).close();
        letGo();
      },
      terminated: letGo,
    });
  const made = opening();
  made.catch(letGo);
  open.set(userId, made);
  return made;
}

/** Runs on the device's store, or gives `otherwise` where there is none. */
async function onDevice<T>(
  userId: string,
  work: (db: IDBPDatabase<Uploads>) => Promise<T>,
  otherwise: T,
): Promise<T> {
  const db = await database(userId).catch(() => null);
  return db ? work(db) : otherwise;
}

export async function keepUpload(userId: string, upload: WaitingUpload): Promise<void> {
  try {
    await (await database(userId)).put('uploads', upload);
    unkept.delete(upload.key);
  } catch {
    unkept.set(upload.key, { ...upload, userId });
  }
}

/** In the order in which they were added. */
export async function listUploads(userId: string, roundId: string): Promise<WaitingUpload[]> {
  const kept = await onDevice(userId, (db) => db.getAllFromIndex('uploads', 'round', roundId), []);
  const loose = [...unkept.values()].filter((one) => one.userId === userId && one.roundId === roundId);
  const looseKeys = new Set(loose.map(({ key }) => key));
  return [...kept.filter(({ key }) => !looseKeys.has(key)), ...loose].sort((a, b) =>
    a.key < b.key ? -1 : 1,
  );
}

export async function dropUpload(userId: string, key: string): Promise<void> {
  unkept.delete(key);
  await onDevice(userId, (db) => db.delete('uploads', key), undefined);
}

export const countUploads = (userId: string): Promise<number> =>
  onDevice(userId, (db) => db.count('uploads'), 0);

export async function wipeUploads(userId: string): Promise<void> {
  for (const [key, upload] of unkept) if (upload.userId === userId) unkept.delete(key);
  const db = await open.get(userId)?.catch(() => null);
  db?.close();
  open.delete(userId);
  await deleteDB(nameOf(userId));
}
