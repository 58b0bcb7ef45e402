import type { MarkHistory } from './model/history';
import { replaceMarks, startHistory } from './model/history';
import { mergeServer, type SavedMark, type Standing, startStanding } from './model/sync';

/** What the device keeps of one photo's marks: the way back, and where they stand with the server. */
export interface KeptMarks {
  history: MarkHistory;
  standing: Standing;
}

export const startKept = (): KeptMarks => ({ history: startHistory([]), standing: startStanding() });

/** Before the server has answered there is nothing to lay under: an empty list would read as all marks deleted. */
export function layOver(kept: KeptMarks, server: readonly SavedMark[] | null): KeptMarks {
  if (!server) return kept;
  const { marks, standing } = mergeServer(kept.history.marks, kept.standing, server);
  return { history: replaceMarks(kept.history, marks), standing };
}
