import sharp from 'sharp';
import type { Viewer } from '../queries/viewer';
import { DEMO_GARMENTS } from './demo';
import { hangDemoGarment } from './hang-garment';

// The demo draws its pictures itself, as SVG; what people send is never read as one.
sharp.unblock({ operation: ['VipsForeignLoadSvg'] });
const [viewer = '', index = ''] = process.argv.slice(2);
const garment = DEMO_GARMENTS[Number(index)];
if (!garment) throw new Error(`there is no demo garment ${index}`);
await hangDemoGarment(JSON.parse(viewer) as Viewer, garment, Number(index) + 1);
process.exit(0);
