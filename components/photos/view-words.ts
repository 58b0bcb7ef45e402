import type { View } from '@/diagnosis/garments/schema';

export const VIEW_WORDS: Record<View, string> = {
  front: 'Front',
  back: 'Back',
  left: 'Your left',
  right: 'Your right',
  seated: 'Seated',
  'close-up': 'Close-up',
};

export const VIEW_OPTIONS = (Object.entries(VIEW_WORDS) as [View, string][]).map(([value, label]) => ({
  value,
  label,
}));

export const TAKEN_OPTIONS = [
  { value: 'camera', label: 'By a camera' },
  { value: 'mirror', label: 'In a mirror' },
] as const;
