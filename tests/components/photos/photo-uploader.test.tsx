import { cleanup, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { PhotoUploader } from '@/components/photos/PhotoUploader';
import type { UploadEnd } from '@/components/photos/send-upload';
import type { WaitingUpload } from '@/components/photos/upload-store';
import type { PhotoDto } from '@/db/queries/photos';

const server = vi.hoisted(() => ({ send: vi.fn<(upload: WaitingUpload) => Promise<UploadEnd>>() }));
vi.mock('@/components/photos/send-upload', () => ({ sendUpload: server.send }));
vi.mock('@/components/photos/prepare-photo', async () => {
  const { v7 } = await import('uuid');
  return {
    makeUploadKey: () => v7(),
    preparePhoto: async (file: Blob) => file,
    readyToPrepare: async () => true,
  };
});

const photo = (id: string) => ({ id }) as PhotoDto;
const file = (name: string) => new File(['x'], name, { type: 'image/jpeg' });

let rounds = 0;
beforeEach(() => {
  rounds += 1;
  server.send.mockReset();
});
afterEach(cleanup);

function uploader(onAdded: (photo: PhotoDto) => void = () => {}) {
  const props = { userId: 'u', roundId: `page ${rounds}`, view: 'back' as const, onAdded };
  const { rerender } = render(<PhotoUploader {...props} isFolded={false} />);
  return { fold: () => rerender(<PhotoUploader {...props} isFolded />) };
}

it('keeps the sentence of a refused file in sight when a good one has come and the questions fold away', async () => {
  server.send
    .mockResolvedValueOnce({ kind: 'refused', message: 'This is not a JPEG, PNG or WebP picture.' })
    .mockResolvedValueOnce({ kind: 'added', photo: photo('p') });
  const { fold } = uploader(() => fold());
  await userEvent.upload(screen.getByLabelText('Add photos'), [file('words.jpg'), file('good.jpg')]);
  await waitFor(() => expect(screen.getByText('Add photos', { selector: 'summary' })).toBeVisible());
  const lines = within(screen.getByRole('list', { name: 'Photos on their way' })).getAllByRole('listitem');
  expect(lines).toHaveLength(1);
  expect(lines[0]).toBeVisible();
  expect(lines[0]).toHaveTextContent('words.jpg not taken');
  expect(lines[0]).toHaveTextContent('This is not a JPEG, PNG or WebP picture.');
  await userEvent.click(screen.getByRole('button', { name: 'Put away words.jpg' }));
  expect(screen.queryByText(/words.jpg/)).toBeNull();
});

it('sends what was said: the view on the table unless another is chosen, and whether a mirror was between', async () => {
  server.send.mockResolvedValue({ kind: 'added', photo: photo('p') });
  uploader();
  await userEvent.upload(screen.getByLabelText('Add photos'), file('a.jpg'));
  await waitFor(() => expect(server.send).toHaveBeenCalledTimes(1));
  await userEvent.click(screen.getByLabelText('Seated'));
  await userEvent.click(screen.getByLabelText('In a mirror'));
  await userEvent.upload(screen.getByLabelText('Take a photo'), file('b.jpg'));
  await waitFor(() => expect(server.send).toHaveBeenCalledTimes(2));
  expect(server.send.mock.calls.map(([{ view, isMirrored }]) => [view, isMirrored])).toEqual([
    ['back', false],
    ['seated', true],
  ]);
});

it('offers the camera for one photo and the gallery for several, of kinds that every browser can send', () => {
  uploader();
  const camera = screen.getByLabelText('Take a photo');
  const gallery = screen.getByLabelText('Add photos');
  expect(camera).toHaveAttribute('capture', 'environment');
  expect(camera).not.toHaveAttribute('multiple');
  expect(gallery).toHaveAttribute('multiple');
  expect(gallery).not.toHaveAttribute('capture');
  for (const input of [camera, gallery])
    expect(input).toHaveAttribute('accept', 'image/jpeg,image/png,image/webp');
});
