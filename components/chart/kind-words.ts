import type { ChartKind } from '@/diagnosis/chart/chart';

export const KIND_WORDS: Record<ChartKind, { title: string; lead: string }> = {
  body: {
    title: 'Bodies the sizes are for',
    lead: 'The size chart as it is printed: body measures, not those of the garment.',
  },
  finished: {
    title: 'Finished measures',
    lead: 'What the garment measures when sewn, if the pattern says so. Sizes named as in the chart above.',
  },
  paper: {
    title: 'Measured on the paper',
    lead: 'Between seamlines, allowances left out, of the size you mean to cut. It counts before a printed finished measure.',
  },
};
