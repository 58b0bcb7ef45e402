'use client';
import { Notice } from '@/components/ui/Notice';
import type { Knowledge } from '@/diagnosis/garments/schema';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { CommentForm } from './CommentForm';
import { CommentList } from './CommentList';
import { ProposalCard } from './ProposalCard';
import { useConversation } from './useConversation';

interface Props {
  roundId: string;
  knowledge: Knowledge;
  unit: LengthUnit;
  isOwner: boolean;
  mayFit: boolean;
}

/** What is said about a round by everyone it is open to, and the plans they propose. */
export function ConversationPanel({ roundId, knowledge, unit, isOwner, mayFit }: Props) {
  const { data, error, mutate } = useConversation(roundId);
  const again = () => void mutate();
  return (
    <div className="grid gap-5">
      {error ? (
        <Notice tone="care">What others say cannot be read just now. It is tried again by itself.</Notice>
      ) : null}
      {data?.proposals.map((proposal) => (
        <ProposalCard
          key={proposal.id}
          proposal={proposal}
          knowledge={knowledge}
          unit={unit}
          isOwner={isOwner}
          onAnswered={again}
        />
      ))}
      {data ? <CommentList comments={data.comments} knowledge={knowledge} onChanged={again} /> : null}
      {mayFit ? <CommentForm roundId={roundId} knowledge={knowledge} onSaid={again} /> : null}
    </div>
  );
}
