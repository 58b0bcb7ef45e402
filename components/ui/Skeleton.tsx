/** The shape of what is coming, so that nothing jumps when it is there. */
export function Skeleton({ lines }: { lines: number }) {
  return (
    <div role="status" aria-label="Loading" className="grid gap-3">
      {Array.from({ length: lines }, (_, line) => (
        <span key={line} className="block h-6 bg-weave" style={{ width: `${88 - ((line * 17) % 40)}%` }} />
      ))}
    </div>
  );
}
