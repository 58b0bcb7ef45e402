import type { Knowledge } from '../schema';
import { causes } from './causes';
import { checks } from './checks';
import { forkCorrections } from './corrections-fork';
import { legCorrections } from './corrections-leg';
import { lengthCorrections } from './corrections-length';
import { widthCorrections } from './corrections-width';
import { dimensions } from './dimensions';
import { shapeNotes } from './shape';
import { frontSigns } from './signs-front';
import { legSigns } from './signs-leg';
import { seatSigns } from './signs-seat';
import { sums } from './sums';

/** Everything Ruckle knows about trousers. */
export const trousers: Knowledge = {
  garment: 'trousers',
  name: 'Trousers',
  dimensions,
  causes,
  signs: [...seatSigns, ...frontSigns, ...legSigns],
  checks,
  corrections: [...lengthCorrections, ...forkCorrections, ...widthCorrections, ...legCorrections],
  shape: shapeNotes,
  sums,
};
