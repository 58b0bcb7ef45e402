'use client';
import { Dialog } from 'radix-ui';
import { Button } from '@/components/ui/Button';

const KEYS = [
  ['1 to 6', 'tight line, slack fold, gap, pooling, tilt, pin'],
  ['7', 'look and choose'],
  ['Arrows', 'move the cross, or the chosen mark, by a pixel'],
  ['Shift and arrows', 'the same by ten pixels'],
  ['Enter', 'set a point; twice in one place ends the line; when looking, choose the mark at the cross'],
  ['Escape', 'let go'],
  ['Delete', 'delete the chosen mark'],
  ['Ctrl Z, Ctrl Shift Z', 'undo, redo'],
  ['+ and −', 'nearer, farther'],
  ['0', 'the whole photo'],
] as const;

interface Props {
  isOpen: boolean;
  onClose: () => void;
  /** Gone from sight: the focus goes back to the photo. */
  onClosed: () => void;
}

export function KeyHelp({ isOpen, onClose, onClosed }: Props) {
  return (
    <Dialog.Root open={isOpen} onOpenChange={(open) => !open && onClose()}>
      <Dialog.Portal>
        <Dialog.Overlay className="fixed inset-0 z-40 bg-black/50" />
        <Dialog.Content
          aria-describedby={undefined}
          onCloseAutoFocus={(event) => {
            event.preventDefault();
            onClosed();
          }}
          className="fixed inset-x-4 top-10 z-50 mx-auto grid max-w-lg gap-4 bg-paper p-6 shadow-lifted"
        >
          <Dialog.Title className="text-lg font-bold">Keys on the photo</Dialog.Title>
          <dl className="grid grid-cols-[auto_1fr] gap-x-6 gap-y-2">
            {KEYS.map(([key, what]) => (
              <div key={key} className="contents">
                <dt className="font-bold">{key}</dt>
                <dd>{what}</dd>
              </div>
            ))}
          </dl>
          <div>
            <Button onClick={onClose}>Close</Button>
          </div>
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
