'use client';
import { useMemo, useState } from 'react';
import { CheckPanel } from '@/components/checks/CheckPanel';
import { ConversationPanel } from '@/components/conversation/ConversationPanel';
import { ProposeForm } from '@/components/conversation/ProposeForm';
import { PlanPanel } from '@/components/plan/PlanPanel';
import { type Proposal, usePlan } from '@/components/plan/usePlan';
import { plannedKey, ReadingPanel } from '@/components/reading/ReadingPanel';
import { useDiagnosis } from '@/components/reading/useDiagnosis';
import { SignPicker } from '@/components/signs/SignPicker';
import { Section } from '@/components/ui/Section';
import { Skeleton } from '@/components/ui/Skeleton';
import type { DeskDto } from '@/db/queries/desk';
import type { PhotoDto } from '@/db/queries/photos';
import { caseFromRounds } from '@/diagnosis/case-from-rounds';
import type { View } from '@/diagnosis/garments/schema';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { Contested } from './Contested';
import { roundWithEvidence } from './evidence-state';
import { JumpBar } from './JumpBar';
import { PhotoStage } from './PhotoStage';
import { RoundNotes } from './RoundNotes';
import { RoundsRail } from './RoundsRail';
import { SaveLine } from './SaveLine';
import { useEvidence } from './useEvidence';

interface Props {
  desk: DeskDto;
  number: number;
  photos: PhotoDto[];
  userId: string;
  unit: LengthUnit;
}

/** One round on the table: its photos with marks, what shows, the tests, the reading and the plan. */
export function RoundDesk({ desk, number, photos, userId, unit }: Props) {
  const at = desk.rounds.findIndex((one) => one.number === number);
  const round = desk.rounds[at]!;
  const [view, setView] = useState<View>(photos[0]?.view ?? 'front');
  const evidence = useEvidence({ userId, round, unit });
  const planning = usePlan(round.id, round.changes, unit);
  const input = useMemo(() => {
    const now = roundWithEvidence(round, evidence.state, desk.isOwner);
    return caseFromRounds(desk.garment, desk, [...desk.rounds.slice(0, at), now]);
  }, [desk, round, at, evidence.state]);
  const { knowledge, reading } = useDiagnosis(desk.garment, input);
  const planned = new Set(planning.plan.map(({ correction, side }) => plannedKey(correction, side)));
  const [proposing, setProposing] = useState<Proposal[]>([]);
  const isProposed = (a: Proposal) => (b: Proposal) => a.correction === b.correction && a.side === b.side;
  const addProposed = (one: Proposal) =>
    setProposing((now) => [...now.filter((other) => !isProposed(one)(other)), one]);
  const mayPropose = !desk.isOwner && round.mayFit;
  const isOpen = desk.isOwner && !planning.plan.some((change) => change.madeAt !== null);

  return (
    <div className="grid gap-8 lg:grid-cols-[11rem_minmax(0,1fr)_24rem] xl:grid-cols-[13rem_minmax(0,1fr)_28rem]">
      <RoundsRail journalId={desk.journalId} rounds={desk.rounds} number={number} />
      <div className="grid min-w-0 content-start gap-8">
        <PhotoStage
          round={round}
          photos={photos}
          userId={userId}
          isOwner={desk.isOwner}
          view={view}
          onView={setView}
          previousRoundId={desk.rounds[at - 1]?.id ?? null}
          reading={
            knowledge
              ? { knowledge, cut: round.cut, state: evidence.state, onEdit: evidence.edit }
              : undefined
          }
        />
        {round.mayFit ? (
          <Section title="What shows" id="shows">
            <SaveLine state={evidence.saveState} />
            <Contested
              state={evidence.state}
              conflicts={evidence.conflicts}
              knowledge={knowledge}
              onChoose={evidence.edit}
            />
            {knowledge ? (
              <SignPicker
                knowledge={knowledge}
                view={view}
                cut={round.cut}
                state={evidence.state}
                onEdit={evidence.edit}
              />
            ) : (
              <Skeleton lines={8} />
            )}
          </Section>
        ) : null}
        {knowledge ? (
          <Section title="Said about this round" id="said">
            <ConversationPanel
              roundId={round.id}
              knowledge={knowledge}
              unit={unit}
              isOwner={desk.isOwner}
              mayFit={round.mayFit}
            />
          </Section>
        ) : null}
        <RoundNotes round={round} isOwner={desk.isOwner} />
      </div>
      <div className="grid content-start gap-8">
        <Section title="The reading" id="reading">
          {knowledge && reading ? (
            <ReadingPanel
              knowledge={knowledge}
              reading={reading}
              unit={unit}
              planned={planned}
              onTake={
                isOpen ? (proposal) => void planning.take(proposal) : mayPropose ? addProposed : undefined
              }
              onRuleOut={
                round.mayFit
                  ? (id) => evidence.edit([{ kind: 'cause', id, side: 'both', value: false }])
                  : undefined
              }
            />
          ) : (
            <Skeleton lines={6} isTall />
          )}
        </Section>
        {round.mayFit ? (
          <Section title="Try it" id="try">
            {knowledge && reading ? (
              <CheckPanel
                knowledge={knowledge}
                asked={reading.checks}
                state={evidence.state}
                unit={unit}
                onEdit={evidence.edit}
              />
            ) : (
              <Skeleton lines={4} />
            )}
          </Section>
        ) : null}
        {mayPropose && knowledge ? (
          <Section title="Propose a plan" id="propose">
            <ProposeForm
              roundId={round.id}
              knowledge={knowledge}
              unit={unit}
              changes={proposing}
              onDrop={(one) => setProposing((now) => now.filter((other) => !isProposed(one)(other)))}
              onProposed={() => setProposing([])}
            />
          </Section>
        ) : null}
        {desk.isOwner && knowledge ? (
          <Section title="The plan for the next round" id="plan">
            <PlanPanel
              journalId={desk.journalId}
              knowledge={knowledge}
              reading={reading}
              plan={planning.plan}
              problem={planning.problem}
              fitted={input}
              unit={unit}
              onSet={planning.set}
              onDrop={(id) => void planning.drop(id)}
            />
          </Section>
        ) : null}
      </div>
      <JumpBar reading={reading} />
    </div>
  );
}
