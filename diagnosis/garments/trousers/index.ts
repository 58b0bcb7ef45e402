import type { Knowledge } from '../schema';
import { causes } from './causes';
import { lifts } from './checks/lifts';
import { looks } from './checks/looks';
import { pins } from './checks/pins';
import { releases } from './checks/releases';
import { forkCorrections } from './corrections-fork';
import { legCorrections } from './corrections-leg';
import { lengthCorrections } from './corrections-length';
import { widthCorrections } from './corrections-width';
import { dimensions } from './dimensions';
import { shapeNotes } from './shape';
import { backWaistSigns } from './signs/back-waist';
import { frontForkSigns } from './signs/front-fork';
import { frontWaistSigns } from './signs/front-waist';
import { hemSigns } from './signs/hem';
import { hipSigns } from './signs/hip';
import { legSigns } from './signs/leg';
import { seatSigns } from './signs/seat';
import { thighSigns } from './signs/thigh';
import { sums } from './sums';

/** Everything Ruckle knows about trousers. */
export const trousers: Knowledge = {
  garment: 'trousers',
  name: 'Trousers',
  dimensions,
  causes,
  signs: [
    ...frontWaistSigns,
    ...frontForkSigns,
    ...hipSigns,
    ...backWaistSigns,
    ...seatSigns,
    ...thighSigns,
    ...legSigns,
    ...hemSigns,
  ],
  checks: [...looks, ...lifts, ...pins, ...releases],
  corrections: [...lengthCorrections, ...forkCorrections, ...widthCorrections, ...legCorrections],
  shape: shapeNotes,
  sums,
};
