import type { ComponentProps, ReactNode } from 'react';

type Props = Omit<ComponentProps<'input'>, 'type'> & { label: ReactNode };

/** A box to tick, with its words as part of the target. */
export function Tick({ label, ...rest }: Props) {
  return (
    <label className="flex min-h-11 items-start gap-3 py-2">
      <input type="checkbox" className="mt-1 size-5 shrink-0 accent-chalk" {...rest} />
      <span>{label}</span>
    </label>
  );
}
