import { describe, expect, it } from 'vitest';
import { encodePhoto, VARIANTS } from '@/lib/photos/encode';
import { HOSTILE_FILES, SCRIPT_MARK } from '../../support/hostile-files';
import { XMP_MARK } from '../../support/jpeg-segments';

const FORBIDDEN = [
  SCRIPT_MARK,
  XMP_MARK,
  'RUCKLE-EXIF-MARK',
  'Exif',
  'http://ns.adobe.com',
  'ICC_PROFILE',
  'PK\x03\x04',
];

describe('files that are no photo, or more than one', () => {
  it('are forty at the least', () => {
    expect(HOSTILE_FILES.length).toBeGreaterThanOrEqual(40);
    expect(new Set(HOSTILE_FILES.map(({ name }) => name)).size).toBe(HOSTILE_FILES.length);
  });

  it.each(HOSTILE_FILES)(
    '$name: refused by name, or made anew with nothing of it left',
    async ({ make, ends }) => {
      const ending = await encodePhoto(await make());
      expect([ends].flat()).toContain('fault' in ending ? ending.fault : 'taken');
      if ('fault' in ending) return;
      for (const variant of VARIANTS)
        for (const mark of FORBIDDEN)
          expect(ending.files[variant].includes(mark), `${variant} holds ${mark}`).toBe(false);
    },
  );
});
