import type { Side } from './evidence-state';

/** The wearer's sides as a choice shows them. */
export const SIDE_OPTIONS: readonly { value: Side; label: string }[] = [
  { value: 'both', label: 'Both sides' },
  { value: 'left', label: 'Your left' },
  { value: 'right', label: 'Your right' },
];
