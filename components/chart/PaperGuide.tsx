import { Disclosure } from '@/components/ui/Disclosure';

const LINE = { fill: 'none', stroke: 'var(--ink)', strokeWidth: 2, vectorEffect: 'non-scaling-stroke' } as const; // prettier-ignore
const TAPE = { ...LINE, stroke: 'var(--chalk)', strokeWidth: 4, strokeLinecap: 'round' } as const;

/** Where the tape goes on a front and a back piece: along the seamlines, never along the cut edge. */
export function PaperGuide() {
  return (
    <Disclosure summary="How to measure the paper">
      <svg viewBox="0 0 300 250" className="h-auto w-full max-w-md" role="img" aria-labelledby="paper-guide">
        <title id="paper-guide">
          A front and a back piece with the tape along the crotch seam, across hip and thigh, and down the
          inseam
        </title>
        <g>
          <path d="M40 20H110L118 110L104 235H58L22 112C34 108 40 96 40 78Z" {...LINE} />
          <path d="M40 20V78C40 96 34 108 22 112" {...TAPE} />
          <path d="M40 78H115" {...TAPE} />
          <path d="M24 122H117" {...TAPE} />
          <text x="60" y="60" fontSize="13" fill="var(--ink)">
            Front
          </text>
        </g>
        <g>
          <path d="M182 24L258 12C266 60 270 90 274 112L244 235H186L150 122C172 116 178 96 176 80Z" {...LINE} />
          <path d="M258 12C266 60 270 90 274 112" {...LINE} />
          <path d="M182 24L176 80C178 96 172 116 150 122" {...TAPE} />
          <path d="M176 80L268 78" {...TAPE} />
          <path d="M150 122L186 235" {...TAPE} />
          <text x="206" y="60" fontSize="13" fill="var(--ink)">
            Back
          </text>
        </g>
      </svg>
      <ul className="grid max-w-prose list-disc gap-1 pl-5">
        <li>Stand the tape on its edge and walk it along the seamline of the crotch, waist to inseam.</li>
        <li>Hip and waist: front and back together, twice; darts and pleats folded shut.</li>
        <li>Thigh: front and back of one leg, 25 mm (1 in) below the fork.</li>
        <li>Inseam: from the fork to the finished hem. Depth: from the waist seam down to the crotch line.</li>
      </ul>
    </Disclosure>
  );
} // prettier-ignore
