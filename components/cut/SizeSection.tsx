import { Amount } from '@/components/ui/Amount';
import { EmptyState } from '@/components/ui/EmptyState';
import { LinkButton } from '@/components/ui/LinkButton';
import { Notice } from '@/components/ui/Notice';
import type { BeforeTheCut } from '@/diagnosis/before-the-cut/before-the-cut';
import { sizeWords } from '@/diagnosis/sizing/levels';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { BaseChoice } from './BaseChoice';
import { BlendList } from './BlendList';
import { LevelSelect } from './LevelSelect';
import { baseOptions, levelOptions } from './size-options';

interface Props {
  cut: BeforeTheCut;
  unit: LengthUnit;
  isHidden: boolean;
  patternId: string;
  wearerId: string;
}

/** Which size at each level, how far its neighbours are, and the lines to draw between. */
export function SizeSection({ cut, unit, isHidden, patternId, wearerId }: Props) {
  const { charts, sizes, levels, blends } = cut;
  const order = charts.body.sizes.length > 0 ? charts.body : charts.garment;
  if (order.sizes.length === 0)
    return (
      <EmptyState
        title="The pattern has no sizes yet"
        action={<LinkButton href={`/patterns/${patternId}/chart`}>Type or paste its chart</LinkButton>}
      >
        <p>Its size chart and what you measured tell which size to cut, and where to blend.</p>
      </EmptyState>
    );
  return (
    <>
      {levels.length === 0 ? (
        <Notice>
          Chart and body have no level in common yet.{' '}
          <LinkButton look="quiet" href={`/wearers/${wearerId}/measure`}>
            Take waist, hip and thigh
          </LinkButton>
        </Notice>
      ) : null}
      {sizes.choice.stops.map((stop) => (
        <Notice key={stop} tone="care">
          {stop}
        </Notice>
      ))}
      <BaseChoice
        key={sizes.base ? sizeWords(sizes.base) : ''}
        options={baseOptions(sizes.choice.proposals, sizes.base, order)}
        chosen={sizes.base ? sizeWords(sizes.base) : ''}
      />
      <ul className="grid max-w-2xl border-t border-seam">
        {levels.map(({ measure, name, bodyMm, cut: at, neighbours }) => (
          <li key={measure} className="grid grid-cols-[minmax(0,1fr)_9rem] items-center gap-3 border-b border-seam py-2">
            <div>
              <p>
                <span className="font-bold">{name}</span>{' '}
                {isHidden ? null : <Amount mm={bodyMm} unit={unit} />}
              </p>
              <p className="text-sm text-graphite">
                {neighbours.map(({ size, differenceMm }, i) => (
                  <span key={size.ordinal}>
                    {i > 0 ? '; ' : ''}
                    {sizeWords(size)} is <Amount mm={Math.abs(differenceMm)} unit={unit} />{' '}
                    {differenceMm >= 0 ? 'greater' : 'smaller'}
                  </span>
                ))}
              </p>
            </div>
            <LevelSelect key={sizeWords(at)} measure={measure} name={name} options={levelOptions(order)} chosen={sizeWords(at)} />
          </li>
        ))}
      </ul>
      <BlendList blends={blends} unit={unit} />
    </>
  );
} // prettier-ignore
