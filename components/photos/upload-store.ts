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
}

interface Uploads extends DBSchema {
  uploads: { key: string; value: WaitingUpload; indexes: { round: string } };
}

const nameOf = (userId: string) => `ruckle-uploads-${userId}`;
const open = new Map<string, Promise<IDBPDatabase<Uploads>>>();

function database(userId: string): Promise<IDBPDatabase<Uploads>> {
  const had = open.get(userId);
  if (had) return had;
  const made = openDB<Uploads>(nameOf(userId), 1, {
    upgrade: (db) => void db.createObjectStore('uploads', { keyPath: 'key' }).createIndex('round', 'roundId'),
  });
  open.set(userId, made);
  return made;
}

export const keepUpload = async (userId: string, upload: WaitingUpload): Promise<void> =>
  void (await (await database(userId)).put('uploads', upload));

export const listUploads = async (userId: string, roundId: string): Promise<WaitingUpload[]> =>
  (await database(userId)).getAllFromIndex('uploads', 'round', roundId);

export const dropUpload = async (userId: string, key: string): Promise<void> =>
  (await database(userId)).delete('uploads', key);

export const countUploads = async (userId: string): Promise<number> =>
  (await database(userId)).count('uploads');

export async function wipeUploads(userId: string): Promise<void> {
  (await open.get(userId))?.close();
  open.delete(userId);
  await deleteDB(nameOf(userId));
}
