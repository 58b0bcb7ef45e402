import 'server-only';

export const waitSentence = (seconds: number): string =>
  seconds < 90
    ? `That was tried too often. Wait ${seconds} seconds, then try again.`
    : `That was tried too often. Wait ${Math.ceil(seconds / 60)} minutes, then try again.`;
