'use client';
import { join } from '@/components/ui/styles';
import { MEASURES } from '@/diagnosis/measuring/measures';
import { keptTakes } from './sitting';
import type { SittingState } from './useSitting';

/** Every measure with what was typed of it; a line goes to its measure. */
export function MeasureList({ state: { sitting, at, go } }: { state: SittingState }) {
  return (
    <ol className="grid border-t border-seam sm:grid-cols-2 sm:gap-x-6">
      {MEASURES.map(({ id, name }, place) => {
        const takes = keptTakes(sitting[id]);
        return (
          <li key={id} className="border-b border-seam">
            <button
              type="button"
              aria-current={place === at ? 'step' : undefined}
              onClick={() => go(place)}
              className={join('flex min-h-11 w-full items-center justify-between gap-3 px-2 py-1 text-left hover:bg-paper', place === at && 'bg-paper font-bold')}
            >
              <span>{name}</span>{' '}
              <span className={takes.length === 0 ? 'text-graphite' : undefined}>{takes.length === 0 ? 'not taken' : takes.join(', ')}</span>
            </button>
          </li>
        );
      })}
    </ol>
  ); // prettier-ignore
}
