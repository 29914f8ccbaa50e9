const steps = [
  { bytes: 1e9, unit: 'GB', decimals: 1 },
  { bytes: 1e6, unit: 'MB', decimals: 0 },
  { bytes: 1e3, unit: 'kB', decimals: 0 },
] as const;

/** A number of bytes as one says it: "412 MB", "2.4 GB". */
export function sizeInWords(bytes: number): string {
  const step = steps.find((each) => bytes >= each.bytes * 0.9995);
  if (!step) return `${bytes}\u00a0bytes`;
  const amount = bytes / step.bytes;
  return `${amount.toFixed(amount < 10 && step.bytes > 1e3 ? 1 : step.decimals)}\u00a0${step.unit}`;
}

/** Time left as one says it, to the nearest 10 s or minute: "about 40 s". */
export function timeLeftInWords(seconds: number): string {
  if (!Number.isFinite(seconds)) return '';
  if (seconds < 10) return 'a few seconds';
  if (seconds < 90) return `about ${Math.round(seconds / 10) * 10}\u00a0s`;
  return `about ${Math.round(seconds / 60)}\u00a0min`;
}
