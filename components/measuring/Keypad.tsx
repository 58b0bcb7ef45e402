'use client';
import { Delete } from 'lucide-react';
import { join } from '@/components/ui/styles';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';

const KEYS = ['1', '2', '3', '4', '5', '6', '7', '8', '9', '.', '0'];
const FRACTIONS = ['⅛', '¼', '⅜', '½', '⅝', '¾', '⅞'];

interface Props {
  unit: LengthUnit;
  onKey: (key: string) => void;
  onErase: () => void;
}

const KEY = 'min-h-12 rounded-md border-2 border-line bg-paper text-lg font-bold hover:border-ink active:bg-weave'; // prettier-ignore

/** Large keys for one thumb, while the other hand holds the tape. Inches have their eighths. */
export function Keypad({ unit, onKey, onErase }: Props) {
  return (
    <div role="group" aria-label="Keys" className="grid gap-2">
      {unit === 'in' ? (
        <div className="grid grid-cols-7 gap-1">
          {FRACTIONS.map((key) => (
            <button key={key} type="button" className={KEY} onClick={() => onKey(key)}>
              {key}
            </button>
          ))}
        </div>
      ) : null}
      <div className="grid grid-cols-3 gap-2">
        {KEYS.map((key) => (
          <button
            key={key}
            type="button"
            className={KEY}
            aria-label={key === '.' ? 'decimal point' : undefined}
            onClick={() => onKey(key)}
          >
            {key}
          </button>
        ))}
        <button
          type="button"
          className={join(KEY, 'grid place-items-center')}
          aria-label="Erase one"
          onClick={onErase}
        >
          <Delete aria-hidden size={22} />
        </button>
      </div>
    </div>
  );
}
