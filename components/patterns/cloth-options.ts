import { CLOTH_KINDS, CLOTH_WORDS } from './pattern-schema';

/** The kinds of cloth as a choice shows them. */
export const CLOTH_OPTIONS = CLOTH_KINDS.map((value) => ({ value, label: CLOTH_WORDS[value] }));

/** How a field of per cent is read: nothing typed is none. */
export const PER_CENT = { setValueAs: (text: string | number) => (text === '' ? 0 : Number(text)) };
