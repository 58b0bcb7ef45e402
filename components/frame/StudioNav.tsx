'use client';
import { Eye, Ruler, Scissors, Settings2, Shirt } from 'lucide-react';
import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { join } from '@/components/ui/styles';

const PLACES = [
  { href: '/journals', label: 'The rail', Icon: Shirt },
  { href: '/fittings', label: 'For others', Icon: Eye },
  { href: '/wearers', label: 'Wearers', Icon: Ruler },
  { href: '/patterns', label: 'Patterns', Icon: Scissors },
  { href: '/settings', label: 'Settings', Icon: Settings2 },
] as const;

/** The main places: along the foot of a phone, in the head of anything wider. */
export function StudioNav() {
  const path = usePathname();
  return (
    <nav
      aria-label="Main"
      className="no-print fixed inset-x-0 bottom-0 z-20 border-t-2 border-line bg-paper pb-[env(safe-area-inset-bottom)] md:static md:border-0 md:bg-transparent md:pb-0"
    >
      <ul className="flex justify-around md:justify-end md:gap-2">
        {PLACES.map(({ href, label, Icon }) => {
          const isHere = path === href || path.startsWith(`${href}/`);
          return (
            <li key={href}>
              <Link
                href={href}
                aria-current={isHere ? 'page' : undefined}
                className={join(
                  'flex min-h-11 min-w-16 flex-col items-center justify-center px-2 py-1 text-sm md:flex-row md:gap-2 md:px-3 md:text-base',
                  isHere
                    ? 'font-bold text-ink underline decoration-chalk decoration-4 underline-offset-8'
                    : 'text-graphite hover:text-ink',
                )}
              >
                <Icon aria-hidden size={20} />
                {label}
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
