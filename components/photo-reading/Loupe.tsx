const SIZE_PX = 136;
const NEARER = 3;

interface Props {
  src: string;
  /** Fractions of the photo. */
  at: { x: number; y: number };
  size: { width: number; height: number };
}

/** What lies under the finger, three times nearer, in the upper corner that the finger is not in. */
export function Loupe({ src, at, size }: Props) {
  const [width, height] = [size.width * NEARER, size.height * NEARER];
  return (
    <div
      aria-hidden
      className="pointer-events-none absolute top-2 z-10 overflow-hidden rounded-full border-4 border-paper bg-weave outline-2 outline-ink"
      style={{
        width: SIZE_PX,
        height: SIZE_PX,
        ...(at.x < 0.5 ? { right: 8 } : { left: 8 }),
        backgroundImage: `url("${src}")`,
        backgroundRepeat: 'no-repeat',
        backgroundSize: `${width}px ${height}px`,
        backgroundPosition: `${SIZE_PX / 2 - at.x * width}px ${SIZE_PX / 2 - at.y * height}px`,
      }}
    >
      <span className="absolute top-1/2 left-0 h-px w-full bg-ink outline-1 outline-paper" />
      <span className="absolute top-0 left-1/2 h-full w-px bg-ink outline-1 outline-paper" />
    </div>
  );
}
