import { Notice } from '@/components/ui/Notice';
import { Section } from '@/components/ui/Section';
import { CHART_KINDS, type ChartKind } from '@/diagnosis/chart/chart';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import type { PatternChartDto } from '@/db/queries/charts';
import { ChartEditor } from './ChartEditor';
import { keptText } from './kept-text';
import { KIND_WORDS } from './kind-words';
import { PaperGuide } from './PaperGuide';

interface Props {
  patternId: string;
  cells: PatternChartDto['cells'];
  unit: LengthUnit;
}

/** The three tables of a pattern. Each is kept by itself; none is needed. */
export function PatternTables({ patternId, cells, unit }: Props) {
  return (
    <div className="grid gap-10">
      {CHART_KINDS.map((kind) => {
        const kept = keptText(cells, kind, unit);
        return (
          <Section key={kind} title={KIND_WORDS[kind].title}>
            {kind === 'paper' ? <PaperGuide /> : null}
            <StrayNames names={strayNames(cells, kind)} />
            <ChartEditor key={kept} patternId={patternId} kind={kind} unit={unit} kept={kept} />
          </Section>
        );
      })}
    </div>
  );
}

/** Sizes of a table that the chart of bodies does not have: nothing can be held against them. */
function strayNames(cells: Props['cells'], kind: ChartKind): string[] {
  const namesOf = (of: ChartKind) =>
    new Set(cells.filter((cell) => cell.kind === of).map(({ size }) => size));
  const known = namesOf('body');
  return known.size === 0 ? [] : [...namesOf(kind)].filter((name) => !known.has(name));
}

function StrayNames({ names }: { names: string[] }) {
  if (names.length === 0) return null;
  return (
    <Notice tone="care">
      Not in the chart of bodies: {names.join(', ')}. A size must have the same name in both, or it is not
      compared.
    </Notice>
  );
}
