import { useEffect } from 'react';
import type { PersonSettings } from '#shared/contracts/people.ts';
import { onBookThemeChosen } from '#src/theme/theme.ts';
import { useOwnActs } from '../api.ts';

/** Puts the person's settings on the page, and keeps the theme they choose with them. Draws nothing. */
export function KeptSettings({ settings }: { settings: PersonSettings | null }) {
  const isRoomy = settings?.roomyRows === true;
  const { mutate } = useOwnActs().set;
  useEffect(() => {
    document.documentElement.classList.toggle('roomy', isRoomy);
    return () => document.documentElement.classList.remove('roomy');
  }, [isRoomy]);
  useEffect(() => onBookThemeChosen((theme) => mutate({ theme })), [mutate]);
  return null;
}
