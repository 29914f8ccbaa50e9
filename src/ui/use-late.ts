import { useEffect, useState } from 'react';

/** False at first, true once `ms` have passed: what is quick is never announced. */
export function useLate(ms = 300): boolean {
  const [late, setLate] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setLate(true), ms);
    return () => clearTimeout(timer);
  }, [ms]);
  return late;
}
