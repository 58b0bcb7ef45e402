import type { ReactNode } from 'react';
import { StudioFrame } from '@/components/frame/StudioFrame';

export default function StudioLayout({ children }: { children: ReactNode }) {
  return <StudioFrame>{children}</StudioFrame>;
}
