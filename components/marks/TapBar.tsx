'use client';
import { Button } from '@/components/ui/Button';

interface Props {
  count: number;
  onEnd: () => void;
  onTakeBack: () => void;
}

/** While a line is being tapped: how to go on, how to end it, how to take a point back. */
export function TapBar({ count, onEnd, onTakeBack }: Props) {
  if (count === 0) return null;
  return (
    <div
      role="group"
      aria-label="The line being set"
      className="flex flex-wrap items-center gap-2 bg-paper p-1"
    >
      <span className="flex-1 px-1 text-sm">
        {count === 1 ? 'Tap where it goes on.' : 'Tap on, or tap the last point again to end it.'}
      </span>
      <Button onClick={onTakeBack}>Take back</Button>
      {count > 1 ? <Button onClick={onEnd}>Done</Button> : null}
    </div>
  );
}
