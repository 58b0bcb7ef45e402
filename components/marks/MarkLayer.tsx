import { memo } from 'react';
import type { Mark } from './model/mark';
import { markText } from './model/mark-text';
import { PhotoMark } from './PhotoMark';

interface Props {
  marks: readonly Mark[];
  /** Drawn by its handles instead, on top. */
  exceptId: string | null;
  widthPx: number;
  heightPx: number;
}

/** All marks but the one in hand. What goes on above it draws none of them again. */
export const MarkLayer = memo(function MarkLayer({ marks, exceptId, widthPx, heightPx }: Props) {
  return (
    <g>
      {marks.map((mark) =>
        mark.id === exceptId ? null : (
          <PhotoMark key={mark.id} mark={mark} widthPx={widthPx} heightPx={heightPx} label={markText(mark)} />
        ),
      )}
    </g>
  );
});
