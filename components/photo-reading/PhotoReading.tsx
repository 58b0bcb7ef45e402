'use client';
import { useDeferredValue, useMemo, useState } from 'react';
import type { Mark } from '@/components/marks/model/mark';
import { entryKey, type Edit, type EvidenceState } from '@/components/round/evidence-state';
import { SIDE_OPTIONS } from '@/components/round/side-options';
import { Button } from '@/components/ui/Button';
import { Disclosure } from '@/components/ui/Disclosure';
import type { LandmarkInput } from '@/db/queries/landmarks';
import type { PhotoDto } from '@/db/queries/photos';
import type { Knowledge, Sign } from '@/diagnosis/garments/schema';
import { offerSigns } from '@/diagnosis/photo/offer-signs';
import { bodyText } from './body-text';
import { isFigureView } from './figure-on-photo';
import { Offers } from './Offers';
import { marksAtHand, marksOnBody, signsOfPlaces } from './read-marks';

/** What a photo's marks are read with, and where what is taken goes. */
export interface ReadingTools {
  knowledge: Knowledge;
  cut: 'full' | 'shorts';
  state: EvidenceState;
  onEdit: (edits: Edit[]) => void;
}

interface Props extends ReadingTools {
  photo: PhotoDto;
  tapped: readonly LandmarkInput[];
  marks: readonly Mark[];
  selected: string | null;
  onPlace: () => void;
}

const NOT_PLACED =
  'Lay the figure on the photo with two taps, and the program can say what your marks may be, and lay this round over the next. Without it you can mark and choose signs all the same.';

/** What the marks of a photo may be, beside it. */
export function PhotoReading({ photo, tapped, marks, selected, onPlace, ...tools }: Props) {
  const drawn = useDeferredValue(marks);
  const body = useMemo(() => marksOnBody(photo, tapped, drawn), [photo, tapped, drawn]);
  if (!isFigureView(photo.view))
    return <p className="text-graphite">A close-up has no figure: choose what it shows by name below.</p>;
  return (
    <section aria-label="What your marks may be" className="grid gap-3">
      <div className="flex flex-wrap items-center gap-3">
        <Button onClick={onPlace}>{body ? 'Move the figure' : 'Place the figure'}</Button>
        {body ? null : <p className="max-w-prose text-sm text-graphite">{NOT_PLACED}</p>}
      </div>
      {body && body.marks.length > 0 ? (
        <Read key={photo.id} body={body} selected={selected} view={photo.view} {...tools} />
      ) : null}
    </section>
  );
}

interface ReadProps extends ReadingTools {
  body: NonNullable<ReturnType<typeof marksOnBody>>;
  selected: string | null;
  view: PhotoDto['view'];
}

const isSaid = (state: EvidenceState, { id }: Sign) =>
  SIDE_OPTIONS.some(({ value: side }) => {
    const entry = state.entries[entryKey({ kind: 'sign', id, side })];
    return entry?.kind === 'sign' && entry.value !== null;
  });

function Read({ body, selected, view, knowledge, cut, state, onEdit }: ReadProps) {
  const [refused, setRefused] = useState<ReadonlySet<string>>(new Set());
  const signs = useMemo(
    () =>
      knowledge.signs.filter(
        (sign) => sign.views.includes(view) && !(cut === 'shorts' && sign.needsFullLength),
      ),
    [knowledge, view, cut],
  );
  const names = useMemo(() => new Map(knowledge.signs.map(({ id, name }) => [id, name])), [knowledge]);
  const atHand = useMemo(() => marksAtHand(body.marks, selected), [body, selected]);
  const offers = useMemo(
    () => offerSigns(signs, [body.figure], atHand, { refused }),
    [signs, body, atHand, refused],
  );
  const unseen = signsOfPlaces(signs, atHand).filter(
    (sign) => !isSaid(state, sign) && !offers.some((offer) => offer.sign === sign.id),
  );
  return (
    <>
      <h3 className="font-bold">{selected ? 'The mark you chose may be' : 'Your marks may be'}</h3>
      {offers.length > 0 ? (
        <Offers
          signs={signs}
          names={names}
          offers={offers}
          state={state}
          onEdit={onEdit}
          onRefuse={(key) => setRefused((now) => new Set([...now, key]))}
        />
      ) : (
        <p className="text-graphite">
          No sign fits these marks. Find it by words or by place under “What shows”.
        </p>
      )}
      {unseen.length > 0 ? (
        <div className="grid justify-items-start gap-1">
          <Button
            onClick={() => onEdit(unseen.map(({ id }) => ({ kind: 'sign', id, side: 'both', value: 0 })))}
          >
            Looked at everything here
          </Button>
          <p className="text-sm text-graphite">
            Writes “looked, not there” for {unseen.length} other {unseen.length === 1 ? 'sign' : 'signs'} of
            these places.
          </p>
        </div>
      ) : null}
      <Disclosure summary="Your marks in words">
        <ul className="list-disc pl-5">
          {body.marks.map((mark) => (
            <li key={mark.id}>{bodyText(mark)}</li>
          ))}
        </ul>
      </Disclosure>
    </>
  );
}
