import sharp from 'sharp';
import { ensureBucket } from '@/lib/photo-store';
import accounts from './accounts.json' with { type: 'json' };
import { DEMO_GARMENTS } from './demo';
import { hangDemoGarment } from './hang-garment';
import { makeDemoAccount } from './make-account';

/** Invented people and garments for a first look, made through the same functions that serve people. */
// The demo draws its pictures itself, as SVG; what people send is never read as one.
sharp.unblock({ operation: ['VipsForeignLoadSvg'] });
await ensureBucket();
for (const account of accounts) {
  const viewer = await makeDemoAccount(account);
  if (account !== accounts[0]) continue;
  for (const [i, garment] of DEMO_GARMENTS.entries()) await hangDemoGarment(viewer, garment, i + 1);
}
process.exit(0);
