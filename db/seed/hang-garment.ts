import { v7 } from 'uuid';
import { clampProportions } from '@/diagnosis/figure/proportions';
import { toMillimetres } from '@/diagnosis/units/millimetres';
import { parseAmount } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';
import { findCorrection } from '@/diagnosis/garments/registry';
import { encodePhoto } from '@/lib/photos/encode';
import { storePhoto } from '@/lib/photos/keep-photo';
import { planChange, updateChange } from '../queries/changes';
import { saveEvidence } from '../queries/evidence';
import { createJournal } from '../queries/journals';
import { saveMarks } from '../queries/marks';
import { addMeasurementSet } from '../queries/measurements';
import { createPattern } from '../queries/patterns';
import { addPhoto } from '../queries/photos';
import { createRound, updateRound } from '../queries/rounds';
import type { Viewer } from '../queries/viewer';
import { createWearer } from '../queries/wearers';
import type { DemoChange, DemoGarment, DemoRound } from './demo';
import { planPhoto, renderPhoto } from './photos/render-photo';

function must<T>(value: T | null | undefined | false, what: string): T {
  if (!value) throw new Error(`the demo could not make ${what}`);
  return value;
}

async function addRoundPhotos(
  viewer: Viewer,
  roundId: string,
  garment: DemoGarment,
  round: DemoRound,
  seed: number,
) {
  for (const [i, { view, folds }] of round.photos.entries()) {
    const spec = {
      view,
      proportions: clampProportions(garment.proportions),
      cloth: garment.photoCloth,
      signs: folds,
      seed: seed + i,
    };
    const encoded = await encodePhoto(await renderPhoto(spec));
    if ('fault' in encoded) throw new Error(`a drawn photo was refused: ${encoded.fault}`);
    const id = v7();
    await storePhoto(id, 1, encoded);
    const { widthPx, heightPx, masterSha256, files } = encoded;
    const row = {
      id,
      uploadKey: v7(),
      view,
      isMirrored: false,
      widthPx,
      heightPx,
      masterSha256,
      masterBytes: files.master.length,
    };
    must(await addPhoto(viewer, roundId, row), 'a photo');
    const upserts = planPhoto(spec).folds.map(({ kind, strength, side, points }) => ({
      seen: 0,
      mark: {
        id: v7(),
        kind,
        severity: strength,
        side: side ?? ('both' as const),
        points: points.map(({ x, y }) => ({ x, y })),
        note: '',
      },
    }));
    if (upserts.length > 0)
      must((await saveMarks(viewer, id, { revision: 1, upserts, deletes: [] })).kind === 'done', 'marks');
  }
}

async function makeChange(viewer: Viewer, garment: DemoGarment, roundId: string, change: DemoChange) {
  const correction = must(findCorrection('trousers', change.correction), change.correction);
  const amount = (mm: number) => ({ mm: toMillimetres(mm), typed: amountText(mm, viewer.unit) });
  const planned = amount(change.plannedMm);
  const row = must(
    await planChange(viewer, roundId, v7(), {
      correction: correction.id,
      side: 'both',
      basis: correction.amounts?.basis ?? null,
      plannedMm: planned.mm,
      plannedTyped: planned.typed,
      reason: '',
    }),
    'a change',
  );
  if (change.madeMm === null) return;
  const made = amount(change.madeMm);
  await updateChange(viewer, row.id, row.version, { isMade: true, madeMm: made.mm, madeTyped: made.typed });
}

async function hangRound(
  viewer: Viewer,
  journalId: string,
  garment: DemoGarment,
  round: DemoRound,
  seed: number,
) {
  const id = v7();
  const { begun, wornOn } = round;
  const start = begun === 'new-cloth' ? { begun, wornOn, muslin: garment.muslin } : { begun, wornOn };
  must(await createRound(viewer, journalId, id, start), 'a round');
  await updateRound(viewer, id, 1, { note: round.note, hangsClean: round.hangsClean ?? false });
  await addRoundPhotos(viewer, id, garment, round, seed);
  const none = { amountMm: null, amountTyped: null, basis: null, places: null };
  await saveEvidence(viewer, id, {
    signs: round.signs.map(([sign, severity]) => ({ sign, severity, side: 'both', seen: 0 })),
    checks: round.checks.map(([check, outcome]) => ({ check, outcome, side: 'both', seen: 0, ...none })),
    causes: round.causes.map(([cause, isPresent]) => ({ cause, isPresent, seen: 0 })),
  });
  for (const change of round.changes) await makeChange(viewer, garment, id, change);
}

/** One invented garment with all its rounds, as its owner would have kept it. */
export async function hangDemoGarment(viewer: Viewer, garment: DemoGarment, seed: number): Promise<void> {
  const { wearer, pattern, measures } = garment;
  const isAgreed = wearer.agreedOn !== null;
  const wearerRow = must(
    await createWearer(viewer, v7(), {
      name: wearer.name, isSelf: wearer.isSelf, isUnder18: false, fittedFor: 'standing', wornBeneath: '', shape: wearer.shape,
      consentsMeasure: isAgreed, consentsPhotograph: isAgreed, consentsShare: false, consentOn: wearer.agreedOn,
    }),
    'a wearer',
  ); // prettier-ignore
  const values = measures.map(({ measure, typed }) => {
    const read = parseAmount(typed, 'cm');
    if (read.kind !== 'amount') throw new Error(read.message);
    return { measure, typed, valueMm: read.mm };
  });
  await addMeasurementSet(viewer, wearerRow.id, v7(), {
    measuredOn: '2026-09-05',
    takenAlone: wearer.isSelf,
    waistPlace: 'band',
    note: '',
    values,
  });
  const draft = must(
    await createPattern(viewer, v7(), { ...pattern, clothKind: 'woven', stretchPercent: 0 }),
    'a pattern',
  );
  const journal = { name: garment.name, wearerId: wearerRow.id, patternDraftId: draft.draftId };
  const journalId = must(await createJournal(viewer, v7(), journal), 'a journal');
  for (const [i, round] of garment.rounds.entries())
    await hangRound(viewer, journalId, garment, round, seed * 100 + i * 10);
}
