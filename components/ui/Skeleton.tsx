import { join } from './styles';

/** The shape of what is coming, so that nothing jumps when it is there. A tall one stands for what fills the screen. */
export function Skeleton({ lines, isTall = false }: { lines: number; isTall?: boolean }) {
  return (
    <div
      role="status"
      aria-label="Loading"
      className={join('grid content-start gap-3', isTall && 'min-h-dvh')}
    >
      {Array.from({ length: lines }, (_, line) => (
        <span key={line} className="block h-6 bg-weave" style={{ width: `${88 - ((line * 17) % 40)}%` }} />
      ))}
    </div>
  );
}
