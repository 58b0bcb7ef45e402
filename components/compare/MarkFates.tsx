import { bodyText } from '@/components/photo-reading/body-text';
import { VIEW_WORDS } from '@/components/photos/view-words';
import { Section } from '@/components/ui/Section';
import type { MarkedPhotoDto } from '@/db/queries/marked-photos';
import type { ComparedMark, MarkState } from '@/diagnosis/photo/compare-marks';
import { becameOfMarks } from './became-of-marks';

/** What still asks for something stands first. */
const HEADS: readonly [MarkState, string][] = [
  ['new', 'Came'],
  ['worse', 'Grew'],
  ['same', 'Stayed'],
  ['eased', 'Eased'],
  ['gone', 'Went'],
  ['hidden', 'Hidden: something tight lies there now'],
  ['not-photographed', 'Not photographed in both'],
];

function fateText({ before, after, lengthRatio }: ComparedMark): string {
  const mark = before ?? after;
  if (!mark) return '';
  const words = `${VIEW_WORDS[mark.view]}: ${bodyText(mark)}`;
  if (!before || !after || lengthRatio === null) return words;
  const percent = Math.round(lengthRatio * 100);
  return Math.abs(percent - 100) < 10 ? words : `${words}; now ${percent} % as long`;
}

/** What became of each mark, matched by its place on the body and measured in crotch depths. */
export function MarkFates(props: { before: readonly MarkedPhotoDto[]; after: readonly MarkedPhotoDto[] }) {
  const { compared, unplaced } = becameOfMarks(props.before, props.after);
  return (
    <Section title="What became of the marks">
      {compared.length === 0 ? <p className="text-graphite">No mark of either round lies on a placed figure yet.</p> : null}
      {HEADS.map(([state, head]) => {
        const own = compared.filter((one) => one.state === state);
        return own.length > 0 ? (
          <div key={state}>
            <h3 className="font-bold">
              {head} <span className="font-normal text-graphite">({own.length})</span>
            </h3>
            <ul className="list-disc pl-5">
              {own.map((one) => (
                <li key={`${one.before?.id} ${one.after?.id}`}>{fateText(one)}</li>
              ))}
            </ul>
          </div>
        ) : null;
      })}
      {unplaced > 0 ? (
        <p className="text-graphite">
          {unplaced === 1 ? 'One mark lies' : `${unplaced} marks lie`} on photos without the figure, and cannot be compared.
        </p>
      ) : null}
    </Section>
  ); // prettier-ignore
}
