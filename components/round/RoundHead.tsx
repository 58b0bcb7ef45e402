import Link from 'next/link';

/** The way back to the garment, and which round this is. */
export function RoundHead({ journalId, name, number }: { journalId: string; name: string; number: number }) {
  return (
    <div className="mb-5">
      <Link
        href={`/journals/${journalId}`}
        className="inline-flex min-h-11 items-center text-chalk underline"
      >
        {name}
      </Link>
      <h1 className="text-2xl">Round {number}</h1>
    </div>
  );
}
