import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { MeasureFlow } from '@/components/measuring/MeasureFlow';

const push = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ push, refresh: vi.fn() }) }));

const sent: unknown[] = [];
const start = { measuredOn: '2026-12-01', takenAlone: true, waistPlace: 'navel' as const };

afterEach(cleanup);
beforeEach(() => {
  sent.length = 0;
  push.mockClear();
  Element.prototype.scrollIntoView = () => {};
  vi.stubGlobal('fetch', (_url: string, init: RequestInit) => {
    sent.push(JSON.parse(String(init.body)));
    return Promise.resolve(new Response('[]', { status: 200, headers: { 'content-type': 'application/json' } })); // prettier-ignore
  });
});

const show = (unit: 'cm' | 'in' = 'cm', last = {}) => {
  render(<MeasureFlow wearerId="w" unit={unit} start={start} last={last} />);
  return userEvent.setup();
};
const press = async (user: ReturnType<typeof userEvent.setup>, ...names: string[]) => {
  for (const name of names) await user.click(screen.getByRole('button', { name }));
};

describe('measuring from the waist down', () => {
  it('keys, left-out measures and repeated takes are sent as they were typed', async () => {
    const user = show();
    await press(user, '7', '8', 'decimal point', '5', 'Take it again', '7', '9', 'Erase one', '8', 'Next'); // prettier-ignore
    expect(screen.getByRole('button', { name: 'Waist 78.5, 78' })).toBeDefined();
    await press(user, 'Save this sitting');
    await waitFor(() => expect(push).toHaveBeenCalledWith('/wearers/w'));
    expect(sent).toMatchObject([{ ...start, unit: 'cm', values: [{ measure: 'waist', take: 1, typed: '78.5' }, { measure: 'waist', take: 2, typed: '78' }] }]); // prettier-ignore
  });

  it('inches have their eighths on the keys', async () => {
    const user = show('in');
    await press(user, '3', '0', '⅜');
    expect(screen.getByRole('button', { name: 'Waist 30⅜' })).toBeDefined();
    expect(screen.queryByRole('alert')).toBeNull();
  });

  it('an inch in a centimetre field is asked about; keeping it is an answer that holds', async () => {
    const user = show();
    await press(user, 'Hip not taken', '4', '0');
    expect(screen.getByText(/is this in inches/)).toBeDefined();
    await press(user, 'It is right, keep it');
    expect(screen.queryByText(/is this in inches/)).toBeNull();
    expect(screen.getByRole('button', { name: 'Hip 40' })).toBeDefined();
  });

  it('copies the last sitting under what is typed already, and nothing is sent without a measure', async () => {
    const user = show('cm', { hip: ['102 cm'], waist: ['80 cm'] });
    await press(user, 'Save this sitting');
    expect(screen.getByRole('alert').textContent).toMatch(/at least one measure/);
    await press(user, 'Leave it out', 'Waist not taken', '7', '9', 'Copy the last sitting');
    expect(screen.getByRole('button', { name: 'Waist 79' })).toBeDefined();
    expect(screen.getByRole('button', { name: 'Hip 102 cm' })).toBeDefined();
    expect(sent).toEqual([]);
  });
});
