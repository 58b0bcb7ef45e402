'use client';
import { ToggleGroup } from 'radix-ui';
import type { MarkSeverity } from './model/mark';
import { SEVERITY_WORDS } from './model/mark-text';

interface Props {
  severity: MarkSeverity;
  onSeverity: (severity: MarkSeverity) => void;
}

const LINES: Record<MarkSeverity, string> = { 1: 'h-0.5', 2: 'h-1', 3: 'h-2' };

/** Faint, clear or pulling, as lines of three weights with their words. */
export function StrengthPicker({ severity, onSeverity }: Props) {
  return (
    <ToggleGroup.Root
      type="single"
      value={String(severity)}
      onValueChange={(value) => value && onSeverity(Number(value) as MarkSeverity)}
      aria-label="How strong"
      className="col-span-3 grid grid-cols-3 lg:col-span-2 lg:grid-cols-1"
    >
      {([1, 2, 3] as const).map((one) => (
        <ToggleGroup.Item
          key={one}
          value={String(one)}
          className="grid min-h-11 grid-cols-[3.2rem] place-content-center gap-1 rounded-md text-sm leading-none data-[state=on]:bg-ink data-[state=on]:text-cloth"
        >
          <span className="flex h-2 items-center">
            <span className={`w-full bg-current ${LINES[one]}`} />
          </span>
          {SEVERITY_WORDS[one]}
        </ToggleGroup.Item>
      ))}
    </ToggleGroup.Root>
  );
}
