/** What a photo holds of one author at most, and what a mark holds: the same where it is drawn and where it is kept. */
export const MARKS_MAX = 500;
export const POINTS_MAX = 400;
export const NOTE_MAX = 400;
