import { PageHead } from '@/components/ui/PageHead';
import type { DeskDto, DeskRoundDto } from '@/db/queries/desk';
import type { MarkedPhotoDto } from '@/db/queries/marked-photos';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { comparedRounds } from './compared';
import { CompareView } from './CompareView';
import { MarkFates } from './MarkFates';
import { PhotoPairs } from './PhotoPairs';
import { RoundChooser } from './RoundChooser';

interface Props {
  desk: DeskDto;
  before: DeskRoundDto;
  after: DeskRoundDto;
  /** Of both rounds. */
  photos: MarkedPhotoDto[];
  unit: LengthUnit;
}

/** Two rounds side by side: the photos with their marks, what was changed between, what became of each sign. */
export function ComparedPair({ desk, before, after, photos, unit }: Props) {
  const of = (round: DeskRoundDto) => photos.filter(({ roundId }) => roundId === round.id);
  const views = of(after).map(({ view }) => view);
  const numbers = desk.rounds.map(({ number }) => number);
  return (
    <div className="grid gap-8">
      <PageHead
        title={`Round ${before.number} and round ${after.number}`}
        lead={desk.journalName}
        actions={<RoundChooser numbers={numbers} a={before.number} b={after.number} />}
      />
      <PhotoPairs
        before={{ number: before.number, photos: of(before) }}
        after={{ number: after.number, photos: of(after) }}
      />
      <MarkFates before={of(before)} after={of(after)} />
      <CompareView compared={comparedRounds(desk, before, after, views)} unit={unit} />
    </div>
  );
}
