import { isFigureView } from '@/components/photo-reading/figure-on-photo';
import { marksOnBody } from '@/components/photo-reading/read-marks';
import type { MarkedPhotoDto } from '@/db/queries/marked-photos';
import type { FigureView } from '@/diagnosis/figure/figure';
import type { BodyMark } from '@/diagnosis/photo/body-mark';
import { type ComparedMark, compareMarks, hiddenByTight } from '@/diagnosis/photo/compare-marks';
import { marksOf } from './shown-photo';

interface OnBodies {
  marks: BodyMark[];
  views: Set<FigureView>;
  /** Marks on photos that the figure does not lie on. */
  unplaced: number;
}

function onBodies(photos: readonly MarkedPhotoDto[]): OnBodies {
  const found: OnBodies = { marks: [], views: new Set(), unplaced: 0 };
  for (const photo of photos) {
    const body = marksOnBody(photo, photo.landmarks, marksOf(photo));
    if (!body || !isFigureView(photo.view)) found.unplaced += photo.marks.length;
    else {
      found.views.add(photo.view);
      found.marks.push(...body.marks.filter(({ kind }) => kind !== 'pin'));
    }
  }
  return found;
}

/** What became of each mark between two rounds, on the body; and how many marks could not be laid on it. */
export function becameOfMarks(
  before: readonly MarkedPhotoDto[],
  after: readonly MarkedPhotoDto[],
): { compared: ComparedMark[]; unplaced: number } {
  const [was, is] = [onBodies(before), onBodies(after)];
  const compared = compareMarks(was.marks, is.marks, {
    viewsBefore: was.views,
    viewsAfter: is.views,
    isHidden: hiddenByTight(is.marks),
  });
  return { compared, unplaced: was.unplaced + is.unplaced };
}
