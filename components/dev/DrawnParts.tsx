'use client';
import { useState } from 'react';
import { Figure } from '@/components/figure/Figure';
import { MarkShape } from '@/components/marks-shapes/MarkShape';
import type { MarkKind, MarkStrength } from '@/components/marks-shapes/mark-paths';
import { SwingTicket } from '@/components/rail/SwingTicket';
import { Ridges } from '@/components/settling/Ridges';
import { Tape } from '@/components/tape/Tape';
import { Section } from '@/components/ui/Section';
import type { FigureView } from '@/diagnosis/figure/figure';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import type { SettlingRow } from '@/diagnosis/settling';

const VIEWS: readonly FigureView[] = ['front', 'back', 'left', 'right', 'seated'];
const KINDS: readonly MarkKind[] = ['tight', 'slack', 'gap', 'pooling', 'tilt', 'pin'];
const STRENGTHS: readonly MarkStrength[] = ['faint', 'clear', 'pulling'];
const GROUNDS = ['#fffdf6', '#1b2a41', '#0b0b0c'] as const;
const AMOUNTS = {
  stepMm: 3,
  firstMm: 6,
  capRoundMm: 10,
  capTotalMm: 19,
  basis: 'edge' as const,
  conversions: { edge: 1, round: 0.25 },
};
const SPREAD = Array.from({ length: 41 }, (_, bin) => (bin - 20) * 3);
const bell = (middleMm: number, sdMm: number) =>
  SPREAD.map((mm) => Math.exp(-0.5 * ((mm - middleMm) / sdMm) ** 2));
const SETTLED: SettlingRow = {
  dimension: 'back-rise', name: 'Back rise', side: 'both', atMm: SPREAD, toleranceMm: 5,
  rounds: [
    { ridge: bell(24, 12), word: 'likely', says: 'the body wants more at centre back' },
    { ridge: bell(11, 7), word: 'possible', says: 'the body wants more at centre back' },
    { ridge: bell(1, 3), word: 'fits', says: null },
  ],
}; // prettier-ignore

/** Figure, marks, tape, tickets and the settling. */
export function DrawnParts() {
  const [amountMm, setAmountMm] = useState(6);
  return (
    <>
      <Section title="The figure">
        <div className="grid grid-cols-2 gap-6 sm:grid-cols-3 lg:grid-cols-5">
          {VIEWS.map((view) => (
            <Figure
              key={view}
              view={view}
              proportions={REFERENCE_PROPORTIONS}
              title={`The figure, ${view}`}
            />
          ))}
        </div>
      </Section>
      <Section title="Marks: faint, clear, pulling, on light, denim and black cloth">
        {GROUNDS.map((ground) => (
          <svg
            key={ground}
            viewBox="0 0 360 130"
            aria-hidden
            className="w-full max-w-xl"
            style={{ background: ground }}
          >
            {KINDS.map((kind, column) =>
              STRENGTHS.map((strength, row) => (
                <MarkShape
                  key={`${kind} ${strength}`}
                  kind={kind}
                  strength={strength}
                  rimmed
                  points={[
                    { x: 15 + column * 58, y: 25 + row * 40 },
                    { x: 55 + column * 58, y: 18 + row * 40 },
                  ]}
                />
              )),
            )}
          </svg>
        ))}
      </Section>
      <Section title="The tape">
        {(['cm', 'in'] as const).map((unit) => (
          <Tape
            key={unit}
            label={`How much, in ${unit}`}
            valueMm={amountMm}
            onChange={setAmountMm}
            amounts={AMOUNTS}
            of={AMOUNTS}
            unit={unit}
          />
        ))}
      </Section>
      <Section title="Tickets and the settling">
        <div className="grid gap-3 sm:grid-cols-2">
          <SwingTicket number={1} date="2026-10-04">
            3 signs, up to pulling
          </SwingTicket>
          <SwingTicket number={2} date={null} isHere>
            hangs clean
          </SwingTicket>
        </div>
        <Ridges row={SETTLED} />
      </Section>
    </>
  );
}
