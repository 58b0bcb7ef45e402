import type { ReactNode } from 'react';
import { PublicFrame } from '@/components/frame/PublicFrame';

export default function PublicLayout({ children }: { children: ReactNode }) {
  return <PublicFrame>{children}</PublicFrame>;
}
