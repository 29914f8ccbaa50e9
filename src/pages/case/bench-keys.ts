/** True in what takes typing or has keys of its own, where the letters and arrows of the bench are left alone. */
export function isField(target: EventTarget): boolean {
  if (!(target instanceof HTMLElement)) return false;
  return target.isContentEditable || target.closest('input, textarea, select, [role="dialog"]') !== null;
}
