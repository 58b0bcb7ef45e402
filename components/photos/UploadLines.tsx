import { X } from 'lucide-react';
import type { UploadLine } from './upload-sender';

const STATE_WORDS = { preparing: 'being made smaller', waiting: 'waiting on this phone', sending: 'being sent', refused: 'not taken' } as const; // prettier-ignore

interface Props {
  lines: UploadLine[];
  onCancel: (key: string) => void;
}

/** How far each photo is, and a sentence for one that was not taken. */
export function UploadLines({ lines, onCancel }: Props) {
  if (lines.length === 0) return null;
  return (
    <ul aria-label="Photos on their way" className="grid gap-2">
      {lines.map(({ key, name, state, part, message }) => (
        <li
          key={key}
          className="grid grid-cols-[1fr_auto] items-center gap-x-3 border-l-4 border-seam bg-paper px-3 py-1"
        >
          <span className="min-w-0">
            <span className="font-bold [overflow-wrap:anywhere]">{name}</span>{' '}
            <span className="text-sm text-graphite">{STATE_WORDS[state]}</span>
          </span>
          <button
            type="button"
            className="inline-flex size-11 items-center justify-center"
            aria-label={state === 'refused' ? `Put away ${name}` : `Do not add ${name}`}
            onClick={() => onCancel(key)}
          >
            <X aria-hidden size={20} />
          </button>
          {state === 'sending' ? (
            <progress
              className="col-span-2 h-2 w-full accent-chalk"
              max={1}
              value={part}
              aria-label={`${name} sent`}
            />
          ) : null}
          <span
            role="status"
            className={state === 'refused' ? 'col-span-2 font-bold text-pin' : 'col-span-2 text-sm'}
          >
            {message}
          </span>
        </li>
      ))}
    </ul>
  );
}
