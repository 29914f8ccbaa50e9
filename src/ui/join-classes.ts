/** Class names in one string; what is false, null or empty is left out. */
export function joinClasses(...names: (string | false | null | undefined)[]): string {
  return names.filter(Boolean).join(' ');
}
