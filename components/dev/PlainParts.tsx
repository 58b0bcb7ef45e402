'use client';
import { useState } from 'react';
import { Amount } from '@/components/ui/Amount';
import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { Disclosure } from '@/components/ui/Disclosure';
import { EmptyState } from '@/components/ui/EmptyState';
import { Notice } from '@/components/ui/Notice';
import { Section } from '@/components/ui/Section';
import { SelectField } from '@/components/ui/SelectField';
import { Skeleton } from '@/components/ui/Skeleton';
import { TextArea } from '@/components/ui/TextArea';
import { TextField } from '@/components/ui/TextField';
import { Tick } from '@/components/ui/Tick';

const CLOTHS = [
  { value: 'woven', label: 'Woven' },
  { value: 'knit', label: 'Knit' },
] as const;
const LOOKS = ['chalk', 'plain', 'quiet', 'danger'] as const;
const AMOUNTS_MM = [3.175, 9.525, 12.7, 41.275] as const;

/** Buttons, fields, words that stand apart, amounts. */
export function PlainParts() {
  const [cloth, setCloth] = useState<'woven' | 'knit'>('woven');
  return (
    <>
      <Section title="Type">
        <p className="text-2xl font-bold">A heading of a page</p>
        <p className="text-lg font-bold">A heading of a part</p>
        <p>Text to read, with a link in it: what the cloth says, changed a little.</p>
        <p className="text-sm text-graphite">A hint beside something else.</p>
        <p className="flex flex-wrap gap-4">
          {AMOUNTS_MM.map((mm) => (
            <span key={mm} className="flex gap-2">
              <Amount mm={mm} unit="in" /> = <Amount mm={mm} unit="cm" />
            </span>
          ))}
        </p>
      </Section>
      <Section title="Buttons">
        {[false, true].map((isOff) => (
          <div key={String(isOff)} className="flex flex-wrap gap-3">
            {LOOKS.map((look) => (
              <Button key={look} look={look} disabled={isOff}>
                {isOff ? `${look}, off` : look}
              </Button>
            ))}
          </div>
        ))}
      </Section>
      <Section title="Fields">
        <div className="grid gap-4 sm:grid-cols-2">
          <TextField label="A field" hint="With a hint." defaultValue="78,5" />
          <TextField
            label="A field that is wrong"
            defaultValue="abc"
            error="This is no length: 78.5 cm or 31 in."
          />
          <SelectField label="A list">
            <option>Front</option>
            <option>Back</option>
          </SelectField>
          <TextField label="A field that is off" defaultValue="not now" disabled />
          <TextArea label="Many words" defaultValue="It felt tight when I sat." />
          <div>
            <Choice legend="One of a few" options={CLOTHS} value={cloth} onChange={setCloth} />
            <Tick label="Something to tick" defaultChecked />
          </div>
        </div>
      </Section>
      <Section title="Words that stand apart">
        <Notice>Plain.</Notice>
        <Notice tone="care" title="With care">
          Change straight pins for safety pins before you sit.
        </Notice>
        <Notice tone="danger">Something could not be saved; it is kept on this device.</Notice>
        <Notice tone="clean">This round hangs clean.</Notice>
        <Disclosure summary="A line that opens">
          <p>What not everyone wants to read at once.</p>
        </Disclosure>
        <EmptyState title="Nothing here yet" action={<Button>The first step</Button>}>
          <p>What this place is for.</p>
        </EmptyState>
        <Skeleton lines={3} />
      </Section>
    </>
  );
}
