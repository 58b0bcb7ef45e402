import type { MeasuredSum } from '../schema';

const term = (dimension: string, weight = 1) => ({ dimension, weight });
const CP: MeasuredSum['sources'] = ['common practice'];

/** What a tape speaks about: weighted sums of needs, never one of them alone. Errors are common practice. */
export const sums: MeasuredSum[] = [
  { id: 'front-crotch-length', name: 'Front crotch length', tapeSdMm: 15, easeSdMm: 12, sources: CP, terms: [term('crotch-depth'), term('front-rise'), term('front-extension'), term('front-curve', 0.9)] },
  { id: 'back-crotch-length', name: 'Back crotch length', tapeSdMm: 15, easeSdMm: 12, sources: CP, terms: [term('crotch-depth'), term('back-rise'), term('back-extension'), term('back-curve', 0.9), term('back-slope', 0.2)] },
  { id: 'seated-depth', name: 'Crotch depth, seated', tapeSdMm: 10, easeSdMm: 6, sources: CP, terms: [term('crotch-depth'), term('side-rise')] },
  { id: 'waist-girth', name: 'Waist', tapeSdMm: 8, easeSdMm: 6, sources: CP, terms: [term('waist-front'), term('waist-back')] },
  { id: 'hip-girth', name: 'Hip', tapeSdMm: 8, easeSdMm: 12, sources: CP, terms: [term('hip-front'), term('hip-back')] },
  { id: 'thigh-girth', name: 'Thigh', tapeSdMm: 8, easeSdMm: 12, sources: CP, terms: [term('front-thigh'), term('back-thigh'), term('front-extension'), term('back-extension')] },
  { id: 'knee-round', name: 'Knee, bent', tapeSdMm: 6, easeSdMm: 6, sources: CP, terms: [term('knee-girth')] },
  { id: 'calf-round', name: 'Calf', tapeSdMm: 5, easeSdMm: 6, sources: CP, terms: [term('calf-girth')] },
  { id: 'inseam-length', name: 'Inseam', tapeSdMm: 8, easeSdMm: 0, sources: CP, terms: [term('leg-length')] },
]; // prettier-ignore
