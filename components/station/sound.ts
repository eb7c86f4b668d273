const CLICK_HZ = 1_400;
const CLICK_S = 0.03;
const CLICK_VOLUME = 0.25;

let audio: AudioContext | null = null;

/** A short click; silent where the platform has no audio context. */
export function click(): void {
  if (typeof AudioContext === 'undefined') return;
  audio ??= new AudioContext();
  const tone = audio.createOscillator();
  const volume = audio.createGain();
  const endS = audio.currentTime + CLICK_S;
  tone.frequency.value = CLICK_HZ;
  volume.gain.setValueAtTime(CLICK_VOLUME, audio.currentTime);
  volume.gain.exponentialRampToValueAtTime(0.001, endS);
  tone.connect(volume).connect(audio.destination);
  tone.start();
  tone.stop(endS);
}

/** Says a count aloud; a newer count cuts an older one short. */
export function speak(text: string): void {
  if (typeof speechSynthesis === 'undefined') return;
  speechSynthesis.cancel();
  speechSynthesis.speak(new SpeechSynthesisUtterance(text));
}
