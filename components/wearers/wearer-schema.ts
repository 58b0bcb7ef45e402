import { z } from 'zod';

const day = z.iso.date('Write the day as year-month-day.').nullable();

export const wearerSchema = z
  .strictObject({
    name: z.string().trim().min(1, 'A name, initials or a made-up name.').max(80, 'At most 80 characters.'),
    isSelf: z.boolean(),
    isUnder18: z.boolean(),
    fittedFor: z.enum(['standing', 'both', 'seated']),
    wornBeneath: z.string().trim().max(200, 'At most 200 characters.'),
    shape: z.array(z.string().max(60)).max(40),
    consentsMeasure: z.boolean(),
    consentsPhotograph: z.boolean(),
    consentsShare: z.boolean(),
    consentOn: day,
  })
  .refine(
    (wearer) =>
      wearer.isSelf || wearer.consentsMeasure || wearer.consentsPhotograph || wearer.consentOn === null,
    {
      path: ['consentOn'],
      message: 'Say what they agreed to: measuring, photographs or both.',
    },
  );

export type WearerForm = z.infer<typeof wearerSchema>;

export const newWearer = (isSelf: boolean): WearerForm => ({
  name: '',
  isSelf,
  isUnder18: false,
  fittedFor: 'standing',
  wornBeneath: '',
  shape: [],
  consentsMeasure: false,
  consentsPhotograph: false,
  consentsShare: false,
  consentOn: null,
});
