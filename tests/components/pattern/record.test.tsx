import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, expect, it } from 'vitest';
import { RecordTable } from '@/components/record/RecordTable';
import type { RecordRow } from '@/components/record/record-rows';

afterEach(cleanup);

const row: RecordRow = {
  id: '1',
  round: 2,
  date: '2026-05-02',
  correction: 'let-out-hip-side',
  name: 'Let out the hip at the side',
  side: 'both',
  pieces: ['front', 'back'],
  of: { basis: 'edge', conversions: { edge: 1, round: 0.25 } },
  plannedMm: 12,
  madeMm: 12,
  isMade: true,
  reason: '',
  sumMm: 20,
  capTotalMm: 16,
};

it('says how much, of what, what it comes to, and that the sum is past its stop', () => {
  render(<RecordTable piece="back" rows={[row]} by="you" unit="cm" />);
  expect(screen.getByRole('table', { name: 'Back' })).toBeInTheDocument();
  expect(screen.getByText('made 12 mm on each of 4 edges = 48 mm round')).toBeInTheDocument();
  expect(screen.getByText(/20 mm of 16 mm/)).toBeInTheDocument();
  expect(screen.getByText('past the stop')).toBeInTheDocument();
});

it('calls a planned change planned, with no sum', () => {
  render(<RecordTable piece="back" rows={[{ ...row, isMade: false, madeMm: null }]} by="you" unit="in" />);
  expect(screen.getByText(/^planned 1\/2 in on each of 4 edges/)).toBeInTheDocument();
  expect(screen.queryByText('past the stop')).not.toBeInTheDocument();
});
