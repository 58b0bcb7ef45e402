import type { Route } from 'next';
import Link from 'next/link';

interface Props<T extends string> {
  items: { id: string; href: Route<T>; title: string; note: string }[];
}

/** Things of one kind, a line each, the whole line a target. */
export function PlainList<T extends string>({ items }: Props<T>) {
  return (
    <ul className="max-w-2xl border-t border-seam">
      {items.map((item) => (
        <li key={item.id} className="border-b border-seam">
          <Link href={item.href} className="grid min-h-14 content-center px-2 py-3 hover:bg-paper">
            <span className="font-bold [overflow-wrap:anywhere]">{item.title}</span>
            {item.note ? <span className="text-sm text-graphite">{item.note}</span> : null}
          </Link>
        </li>
      ))}
    </ul>
  );
}
