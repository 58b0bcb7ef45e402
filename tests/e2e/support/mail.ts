import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';

interface Caught {
  to: string[];
  subject: string;
  text: string;
  messageId: string;
}

const folder = () => {
  const { MAIL_CATCHER_DIR } = process.env;
  if (!MAIL_CATCHER_DIR) throw new Error('MAIL_CATCHER_DIR is not set');
  return MAIL_CATCHER_DIR;
};

export async function mailsTo(address: string): Promise<Caught[]> {
  const names = (await readdir(folder())).filter((name) => name.endsWith('.json')).sort();
  const all = await Promise.all(
    names.map(async (name) => JSON.parse(await readFile(join(folder(), name), 'utf8')) as Caught),
  );
  return all.filter(({ to }) => to.includes(address));
}

/** The link in the newest letter to an address, waited for. */
export async function linkFor(address: string, withinMs = 20_000): Promise<string> {
  for (let waited = 0; waited < withinMs; waited += 250) {
    const link = /https?:\/\/\S+token=\S+/.exec((await mailsTo(address)).at(-1)?.text ?? '')?.[0];
    if (link) return link;
    await new Promise((resolve) => setTimeout(resolve, 250));
  }
  throw new Error(`no letter with a link came for ${address}`);
}
