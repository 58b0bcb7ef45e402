/** The longest file that is taken; browser and server refuse a longer one in the same words. */
export const PHOTO_BYTES_MAX = 25 * 1024 * 1024;
export const TOO_LARGE_MESSAGE = 'This file is over 25 MB. A photo from the phone’s own camera is smaller.';
