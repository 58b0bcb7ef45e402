'use client';
import useSWR from 'swr';
import { fetchJson } from '@/components/net/send';
import type { ConversationDto } from '@/db/queries/conversation';

const EVERY_MS = 4000;

/** What others put on this round, looked for again every few seconds while the page is in sight. */
export function useConversation(roundId: string) {
  const url = `/api/rounds/${roundId}/conversation`;
  return useSWR<ConversationDto>(url, fetchJson, { refreshInterval: EVERY_MS });
}
export type OthersMark = ConversationDto['marks'][number];
