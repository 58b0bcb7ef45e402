const STEPS = [
  [
    'Wear it',
    'Front, back, both sides, seated. Lamp from the side, phone at hip height, two and a half metres away.',
  ],
  ['Mark it', 'Tight lines, slack folds, gaps, tilted seams; and what you looked for and did not find.'],
  [
    'Read it',
    'Ranked changes with what speaks for and against each, and a test for what cannot be told apart yet.',
  ],
  [
    'Change a little',
    'An amount on the tape, its stop mark, what it is of, what must not change, what to walk afterwards.',
  ],
  ['Compare', 'Two rounds side by side: what went, eased, stayed, came. Until it hangs clean.'],
] as const;

export function JobSteps() {
  return (
    <section aria-labelledby="job" className="basted grid gap-5 pt-6">
      <h2 id="job" className="text-lg">
        One round after another
      </h2>
      <ol className="grid gap-x-8 gap-y-6 sm:grid-cols-2 lg:grid-cols-5">
        {STEPS.map(([title, words], step) => (
          <li key={title}>
            <p className="font-bold">
              {step + 1}. {title}
            </p>
            <p className="text-graphite">{words}</p>
          </li>
        ))}
      </ol>
    </section>
  );
}
