export const PHOTO_BYTES_MAX = 25 * 1024 * 1024;

/** Why a file was not taken: one sentence each. In every case nothing of it is kept. */
export const PHOTO_FAULTS = {
  empty: { status: 422, message: 'This file is empty.' },
  'too-large': {
    status: 413,
    message: 'This file is over 25 MB. A photo from the phone’s own camera is smaller.',
  },
  'too-many-pixels': {
    status: 413,
    message: 'This picture has more than 50 megapixels. Save it smaller, then add it again.',
  },
  heic: {
    status: 415,
    message:
      'This is a HEIC or AVIF picture, which cannot be opened here. Save or share it as JPEG, then add it.',
  },
  'not-a-photo': { status: 415, message: 'This is not a JPEG, PNG or WebP picture.' },
  animated: { status: 415, message: 'This picture moves. Add a still one.' },
  damaged: {
    status: 422,
    message: 'This picture is damaged or not whole. Add it again from where it was taken.',
  },
  slow: {
    status: 422,
    message: 'This picture takes too long to open. Save it again as a JPEG, then add it.',
  },
  cut: {
    status: 503,
    message: 'Only a part of this picture arrived. Nothing was kept of it; it is sent again in a moment.',
  },
  busy: { status: 503, message: 'Many pictures are arriving just now. This one is tried again in a moment.' },
} as const;

export type PhotoFault = keyof typeof PHOTO_FAULTS;
