import type { Access } from './roles';
import type { World } from './world';

type Ids = Omit<World, 'sessions'>;

interface Base {
  /** The file under app/ that answers. */
  file: string;
  access: Access;
}
export interface PageRow extends Base {
  kind: 'page';
  path: (ids: Ids) => string;
}
export interface HandlerRow extends Base {
  kind: 'handler';
  method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  path: (ids: Ids) => string;
  /** A body that is valid, so that nothing but permission decides; bytes are sent as a photo, the rest as JSON. */
  body?: (ids: Ids) => unknown;
  /** The photo of the world must lie in the store, not only in the table. */
  hasFiles?: boolean;
  /** The photo of the world lies in the bin. */
  isInBin?: boolean;
}
export interface ActionRow extends Base {
  kind: 'action';
  name: string;
  /** The page that holds its form. */
  path: (ids: Ids) => string;
}
export type Row = PageRow | HandlerRow | ActionRow;

export const nameOf = (row: Row): string =>
  row.kind === 'page' ? row.file : `${row.file} ${row.kind === 'handler' ? row.method : row.name}`;
