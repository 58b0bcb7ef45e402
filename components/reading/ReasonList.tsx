import { sourceWords } from '@/content/source-words';
import { Disclosure } from '@/components/ui/Disclosure';
import type { Reason } from '@/diagnosis/reading';

interface Props {
  because: Reason[];
  against: Reason[];
}

const WIDEST_LOG_ODDS = 3;

/** What speaks for and against, strongest first, with where it is written. The bar repeats what the order says. */
export function ReasonList({ because, against }: Props) {
  if (because.length + against.length === 0) return null;
  return (
    <Disclosure summary="Why">
      <Side title="Speaks for it" reasons={because} />
      <Side title="Speaks against it" reasons={against} />
    </Disclosure>
  );
}

function Side({ title, reasons }: { title: string; reasons: Reason[] }) {
  if (reasons.length === 0) return null;
  return (
    <div>
      <h4 className="font-bold">{title}</h4>
      <ul className="grid gap-2">
        {reasons.map((reason) => (
          <li key={`${reason.kind} ${reason.id} ${reason.side}`} className="text-sm">
            {reason.text}
            <svg viewBox="0 0 100 6" width="100" height="6" aria-hidden className="my-1 block text-graphite">
              <rect
                width={Math.min(100, (Math.abs(reason.logOdds) / WIDEST_LOG_ODDS) * 100)}
                height="6"
                fill="currentColor"
              />
            </svg>
            <Sources ids={reason.sources} />
          </li>
        ))}
      </ul>
    </div>
  );
}

/** Where it is written; what was seen in earlier rounds stands in the journal itself. */
function Sources({ ids }: { ids: string[] }) {
  if (ids.length === 0) return null;
  return (
    <details className="text-graphite">
      <summary className="inline-flex min-h-11 items-center underline underline-offset-4">Written in</summary>
      <ul className="list-disc pl-5">
        {sourceWords(ids).map((words) => (
          <li key={words}>{words}</li>
        ))}
      </ul>
    </details>
  );
}
