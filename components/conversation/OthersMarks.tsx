import { markText } from '@/components/marks/model/mark-text';
import { type MarkSeverity, photoPoint } from '@/components/marks/model/mark';
import { PhotoMark } from '@/components/marks/PhotoMark';
import type { OthersMark } from './useConversation';

interface Props {
  marks: readonly OthersMark[];
  widthPx: number;
  heightPx: number;
}

/** As the marking tools hold a mark; strengths are 1 to 3 by the schema that every mark passed. */
const asMark = ({ id, kind, severity, side, points, note }: OthersMark) => ({
  id,
  kind,
  severity: severity as MarkSeverity,
  side,
  points: points.map(({ x, y }) => photoPoint(x, y)),
  note,
});

/** The layers of everybody else on a photo: to look at, never to move; each says whose it is. */
export function OthersMarks({ marks, widthPx, heightPx }: Props) {
  return (
    <g opacity={0.75} className="pointer-events-none">
      {marks.map((one) => {
        const mark = asMark(one);
        const label = `${one.authorName}: ${markText(mark)}`;
        return (
          <PhotoMark
            key={`${mark.id} ${one.version}`}
            mark={mark}
            widthPx={widthPx}
            heightPx={heightPx}
            label={label}
          />
        );
      })}
    </g>
  );
}
