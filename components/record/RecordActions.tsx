'use client';
import { Button } from '@/components/ui/Button';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { recordCsv } from './record-csv';
import type { RecordRow } from './record-rows';
import { fileName, saveFile } from './save-file';

interface Props {
  rows: RecordRow[];
  garmentName: string;
  by: string;
  unit: LengthUnit;
}

/** To paper, or as a table for other programs; the file is made in the browser. */
export function RecordActions({ rows, garmentName, by, unit }: Props) {
  return (
    <div className="no-print flex flex-wrap gap-3">
      <Button onClick={() => window.print()}>Print</Button>
      <Button
        onClick={() =>
          saveFile(fileName(`${garmentName} record`, 'csv'), 'text/csv', recordCsv(rows, by, unit))
        }
      >
        Save as CSV
      </Button>
    </div>
  );
}
