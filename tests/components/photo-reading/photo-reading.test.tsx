import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, it, vi } from 'vitest';
import { type Mark, photoPoint } from '@/components/marks/model/mark';
import { PhotoReading } from '@/components/photo-reading/PhotoReading';
import { applyEdits, type Edit, type EvidenceState } from '@/components/round/evidence-state';
import { trousers } from '@/diagnosis/garments/trousers';

afterEach(cleanup);

const PHOTO = { id: 'p', view: 'front' as const, isMirrored: false, revision: 1, widthPx: 1000, heightPx: 2000, version: 1 }; // prettier-ignore
/** One crotch depth is a fifth of the width: the waist at 0.2 of the height, the fork at 0.3. */
const TAPPED = [
  { landmark: 'waist-centre', x: 0.5, y: 0.2 },
  { landmark: 'fork', x: 0.5, y: 0.3 },
];
/** Taut lines from the fork up toward the wearer's left hip. */
const MARKS: Mark[] = [[0.58, 0.28], [0.57, 0.272]].map(([x, y], i) => ({
  id: `m${i}`, kind: 'tight', severity: 3, side: 'both', note: '', points: [photoPoint(0.51, 0.299), photoPoint(x!, y!)],
})); // prettier-ignore
const RISING = 'taut-lines-rising-from-front-fork';
const NAME = trousers.signs.find(({ id }) => id === RISING)!.name;

function reading({ tapped = TAPPED, marks = MARKS, said = [] as Edit[] } = {}) {
  const onEdit = vi.fn<(edits: Edit[]) => void>();
  const onPlace = vi.fn();
  const state: EvidenceState = applyEdits({ entries: {}, edits: 0 }, said);
  render(
    <PhotoReading photo={PHOTO} tapped={tapped} marks={marks} selected={null} onPlace={onPlace} knowledge={trousers} cut="full" state={state} onEdit={onEdit} />,
  ); // prettier-ignore
  return { onEdit, onPlace };
}
const offer = () => screen.getByText(NAME, { selector: 'p' }).closest('li')!;

it('offers at most seven signs with a why, and writes nothing by itself', () => {
  const { onEdit } = reading();
  const offered = screen.getAllByRole('button', { name: /^Yes, this one/ });
  expect(offered.length).toBeLessThanOrEqual(7);
  expect(offer()).toHaveTextContent(/It lies at the front fork, rises outward/);
  expect(onEdit).not.toHaveBeenCalled();
});

it('takes an offer at the strength of its marks', async () => {
  const { onEdit } = reading();
  await userEvent.click(screen.getByRole('button', { name: `Yes, this one: ${NAME}` }));
  expect(onEdit).toHaveBeenCalledWith([{ kind: 'sign', id: RISING, side: 'both', value: 3 }]);
});

it('takes another in its place, and offers that one no more', async () => {
  const { onEdit } = reading();
  await userEvent.selectOptions(within(offer()).getByLabelText('It is rather'), 'split-line-at-front-fork');
  expect(onEdit).toHaveBeenCalledWith([{ kind: 'sign', id: 'split-line-at-front-fork', side: 'both', value: 3 }]); // prettier-ignore
  expect(screen.queryByText(NAME, { selector: 'p' })).toBeNull();
});

it('leaves out what was turned down, without a word about the body', async () => {
  const { onEdit } = reading();
  await userEvent.click(screen.getByRole('button', { name: `Not this one: ${NAME}` }));
  expect(screen.queryByText(NAME, { selector: 'p' })).toBeNull();
  expect(onEdit).not.toHaveBeenCalled();
});

it('records what was looked for in these places, but not what is offered or already said', async () => {
  const { onEdit } = reading({ said: [{ kind: 'sign', id: 'split-line-at-front-fork', side: 'both', value: 2 }] }); // prettier-ignore
  await userEvent.click(screen.getByRole('button', { name: 'Looked at everything here' }));
  const edits = onEdit.mock.calls[0]![0];
  expect(edits.length).toBeGreaterThan(0);
  expect(edits.every(({ value }) => value === 0)).toBe(true);
  const ids = edits.map(({ id }) => id);
  expect(ids).not.toContain(RISING);
  expect(ids).not.toContain('split-line-at-front-fork');
});

it('shows what is taken, and takes it back', async () => {
  const { onEdit } = reading({ said: [{ kind: 'sign', id: RISING, side: 'both', value: 3 }] });
  expect(offer()).toHaveTextContent('Taken');
  await userEvent.click(screen.getByRole('button', { name: `Take it back: ${NAME}` }));
  expect(onEdit).toHaveBeenCalledWith([{ kind: 'sign', id: RISING, side: 'both', value: null }]);
});

it('says each mark in words of the body', () => {
  reading();
  expect(screen.getByText(/^Tight line .*front fork.*, pulling, your left, \d+° from plumb$/, { selector: 'li:first-child' })).toBeInTheDocument(); // prettier-ignore
});

it('says what is not possible while the figure does not lie on the photo', async () => {
  const { onPlace } = reading({ tapped: [] });
  expect(screen.getByText(/Without it you can mark/)).toBeInTheDocument();
  expect(screen.queryByRole('button', { name: /Yes, this one/ })).toBeNull();
  await userEvent.click(screen.getByRole('button', { name: 'Place the figure' }));
  expect(onPlace).toHaveBeenCalledOnce();
});
