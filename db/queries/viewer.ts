/** Who is asking. It comes first in every query function, and every query narrows by it. */
export interface Viewer {
  userId: string;
  email: string;
  displayName: string;
  isAdmin: boolean;
  isPatternMaker: boolean;
  isFitter: boolean;
  unit: 'cm' | 'in';
  words: 'uk' | 'us' | 'tailor';
  hidesMeasurements: boolean;
}
