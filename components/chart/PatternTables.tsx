import { Section } from '@/components/ui/Section';
import { CHART_KINDS } from '@/diagnosis/chart/chart';
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
            <ChartEditor key={kept} patternId={patternId} kind={kind} unit={unit} kept={kept} />
          </Section>
        );
      })}
    </div>
  );
}
