import { PhotoMark } from '@/components/marks/PhotoMark';
import { photoUrl } from '@/components/photos/PhotoImage';
import type { MarkedPhotoDto } from '@/db/queries/marked-photos';
import { type Affine, SAME_PLACE } from '@/diagnosis/photo/lay-over';
import { marksOf } from './shown-photo';

/** The pixels across that marks are drawn for; the pane shows them larger or smaller with the photo. */
const MARK_WIDTH_PX = 500;

interface Props {
  photo: MarkedPhotoDto;
  /** From this photo to the frame, lengths in widths. */
  map?: Affine | null;
  hasPicture?: boolean;
  hasMarks: boolean;
  opacity?: number;
  clipPath?: string;
}

/** One photo, or only its marks, laid into a frame whose width is 1. */
export function PhotoLayer({ photo, map, hasPicture = true, hasMarks, opacity, clipPath }: Props) {
  const height = photo.heightPx / photo.widthPx;
  const markHeightPx = MARK_WIDTH_PX * height;
  return (
    <g clipPath={clipPath} opacity={opacity}>
      <g transform={`matrix(${(map ?? SAME_PLACE).join(' ')})`}>
        {hasPicture ? (
          <image href={photoUrl(photo.id, photo.revision, '1600')} width={1} height={height} preserveAspectRatio="none" />
        ) : null}
        {hasMarks ? (
          <g transform={`scale(${1 / MARK_WIDTH_PX})`}>
            {marksOf(photo).map((mark) => (
              <PhotoMark key={mark.id} mark={mark} widthPx={MARK_WIDTH_PX} heightPx={markHeightPx} />
            ))}
          </g>
        ) : null}
      </g>
    </g>
  ); // prettier-ignore
}
