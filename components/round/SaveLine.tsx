import type { SaveState } from './useEvidence';

/** Where one's words are just now, always in sight and never in the way. */
export function SaveLine({ state }: { state: SaveState }) {
  const words =
    state.kind === 'saved'
      ? 'Saved'
      : state.kind === 'saving'
        ? 'Saving…'
        : `On this phone only: ${state.count} waiting. ${state.message}`;
  return (
    <p role="status" className="text-sm text-graphite">
      {words}
    </p>
  );
}
