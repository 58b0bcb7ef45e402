import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ChartEditor } from '@/components/chart/ChartEditor';

vi.mock('next/navigation', () => ({ useRouter: () => ({ push: vi.fn(), refresh: vi.fn() }) }));

const sent: unknown[] = [];
let status = 200;
const FIELD = 'Bodies the sizes are for: type or paste';
const KEEP = { name: 'Keep: bodies the sizes are for' };

afterEach(cleanup);
beforeEach(() => {
  sent.length = 0;
  status = 200;
  sessionStorage.clear();
  vi.stubGlobal('fetch', (_url: string, init: RequestInit) => {
    sent.push(JSON.parse(String(init.body)));
    return Promise.resolve(new Response('{"kind":"failed","message":"It did not go through."}', { status }));
  });
});

const show = () => {
  render(<ChartEditor patternId="p" kind="body" unit="cm" kept="" />);
  return userEvent.setup();
};
const paste = async (user: ReturnType<typeof userEvent.setup>, text: string) => {
  await user.clear(screen.getByLabelText(FIELD));
  await user.click(screen.getByLabelText(FIELD));
  await user.paste(text);
};

describe('a pasted chart', () => {
  it('is shown as it is read, and kept as it was pasted', async () => {
    const user = show();
    await paste(user, 'Size\tHip\n10\t98\n12\t102');
    expect(screen.getByRole('row', { name: /^12 102 cm/ })).toBeDefined();
    await user.click(screen.getByRole('button', KEEP));
    expect(sent).toEqual([{ kind: 'body', unit: 'cm', pasted: 'Size\tHip\n10\t98\n12\t102', allowance: null, leavesOut: false }]); // prettier-ignore
  });

  it('names a faulty cell and is kept only when that cell may be left out', async () => {
    const user = show();
    await paste(user, 'Size\tHip\n10\t98\n12\t=A1');
    expect(screen.getByText('hip, size 12 (row 3, column 2)')).toBeDefined();
    expect(screen.getByRole('button', KEEP)).toHaveProperty('disabled', true);
    await user.click(screen.getByLabelText(/Keep what could be read/));
    await user.click(screen.getByRole('button', KEEP));
    expect(sent).toMatchObject([{ leavesOut: true }]);
  });

  it('outlives a failed save and a reload', async () => {
    status = 500;
    const user = show();
    const text = 'Size\tHip\n10\t98';
    await paste(user, text);
    await user.click(screen.getByRole('button', KEEP));
    expect((await screen.findByRole('alert')).textContent).toBe('It did not go through.');
    expect(screen.getByLabelText(FIELD)).toHaveProperty('value', text);
    cleanup();
    show();
    await waitFor(() => expect(screen.getByLabelText(FIELD)).toHaveProperty('value', text));
  });
});
