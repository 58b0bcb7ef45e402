import { markPaths, type MarkKind, type MarkPath, type MarkStrength, type PixelPoint } from './mark-paths';

const COLOURS: Record<MarkKind, string> = {
  tight: 'var(--pin, #b3261e)',
  slack: 'var(--chalk, #1f5f8b)',
  gap: 'var(--basting, #8a5a00)',
  pooling: 'var(--chalk, #1f5f8b)',
  tilt: 'var(--ink, #16202e)',
  pin: 'var(--graphite, #4a5360)',
};

/** Fixed, because the cloth in a photo does not follow the theme: a light rim inside a dark one shows on any ground. */
const RIMS = [
  { colour: '#10151c', extra: 5 },
  { colour: '#fffdf6', extra: 3 },
] as const;

type Props = {
  kind: MarkKind;
  points: readonly PixelPoint[];
  strength: MarkStrength;
  /** What a screen reader says: "tight line from the inner thigh up to the fork, clear, your left". Left out: decoration. */
  label?: string;
  /** Rims keep a mark legible on photos; on the plain drawn figure they are not needed. */
  rimmed?: boolean;
};

function Stroke({ path, colour, extra }: { path: MarkPath; colour: string; extra: number }) {
  return (
    <path
      d={path.d}
      fill={path.isFilled ? colour : 'none'}
      stroke={colour}
      strokeWidth={path.width + extra}
      strokeDasharray={path.dash?.join(' ')}
      strokeLinecap="round"
      strokeLinejoin="round"
    />
  );
}

/** One mark of the cloth's language, the same on photos, figures, in the handbook and in print. */
export function MarkShape({ kind, points, strength, label, rimmed = true }: Props) {
  const paths = markPaths(kind, points, strength);
  const layers = [...(rimmed ? RIMS : []), { colour: COLOURS[kind], extra: 0 }];
  return (
    <g
      role={label === undefined ? undefined : 'img'}
      aria-label={label}
      aria-hidden={label === undefined ? true : undefined}
      data-mark={kind}
    >
      {layers.map(({ colour, extra }) =>
        paths.map((path, index) => (
          <Stroke key={`${extra}-${index}`} path={path} colour={colour} extra={extra} />
        )),
      )}
    </g>
  );
}
