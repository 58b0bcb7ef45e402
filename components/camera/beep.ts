const BEEP_S = 0.12;

/** A short tone, higher when it counts; silent where the browser makes no sound. */
export function beep(context: AudioContext, isLast: boolean): void {
  const [tone, volume] = [context.createOscillator(), context.createGain()];
  tone.frequency.value = isLast ? 1320 : 880;
  volume.gain.value = 0.2;
  tone.connect(volume).connect(context.destination);
  tone.start();
  tone.stop(context.currentTime + (isLast ? 3 : 1) * BEEP_S);
}
