'use client';
import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { Tick } from '@/components/ui/Tick';
import { useCutEdit } from './CutEdits';

const CUTS = [
  { value: 'full' as const, label: 'Full length' },
  { value: 'shorts' as const, label: 'As shorts' },
];

/** How the muslin is to be cut; the sheet follows. */
export function SheetChoices(start: { cut: 'full' | 'shorts'; isNarrowLeg: boolean }) {
  const edit = useCutEdit();
  const [cut, setCut] = useState(start.cut);
  const [isNarrowLeg, setNarrow] = useState(start.isNarrowLeg);
  return (
    <div className="no-print grid justify-items-start gap-3">
      <Choice
        legend="The muslin"
        options={CUTS}
        value={cut}
        onChange={(next) => {
          setCut(next);
          edit(() => ({ cut: next }));
        }}
      />
      <Tick
        label="The legs are narrow: they hold at knee or calf"
        checked={isNarrowLeg}
        onChange={(event) => {
          const isNow = event.target.checked;
          setNarrow(isNow);
          edit(() => ({ isNarrowLeg: isNow }));
        }}
      />
      <Button onClick={() => window.print()}>Print it</Button>
    </div>
  );
}
