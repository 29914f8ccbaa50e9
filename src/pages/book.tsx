import { useMutation } from '@tanstack/react-query';
import { useCallback, useState } from 'react';
import { Outlet, useLocation, useNavigate } from 'react-router-dom';
import { z } from 'zod';
import { mayInLaboratory } from '#shared/rules/may.ts';
import type { Person } from '#shared/contracts/people.ts';
import { send } from '../http/api.ts';
import { queryClient } from '../http/query-client.ts';
import { usePerson, useSettings } from '../http/session.ts';
import { KeyListDialog } from '../shell/key-list-dialog.tsx';
import { useGlobalKeys } from '../shell/keys.ts';
import type { Place } from '../shell/place.ts';
import { RunningHead } from '../shell/running-head.tsx';

/** Signs out here and forgets everything this page had read. */
export function useSignOut(): () => void {
  const navigate = useNavigate();
  const { mutate } = useMutation({
    mutationFn: () => send('DELETE', '/session', undefined, z.null()),
    onSettled: async () => {
      queryClient.clear();
      await navigate('/sign-in');
    },
  });
  return mutate;
}

/** The places this person may go to. */
export function placesOf(person: Person): Place[] {
  const staff = mayInLaboratory(person, 'read materials').allowed && person.organisationKind === 'laboratory';
  return [
    { to: '/', words: person.organisationKind === 'laboratory' ? 'Casebook' : 'My requests' },
    ...(staff ? [{ to: '/materials', words: 'Materials' }] : []),
    ...laboratoryPlace(person),
  ];
}

/** The laboratory opens on its people for who keeps them, and on its instruments for its other staff. */
function laboratoryPlace(person: Person): Place[] {
  if (mayInLaboratory(person, 'keep people').allowed) return [{ to: '/laboratory', words: 'Laboratory' }];
  if (!mayInLaboratory(person, 'read calibrations').allowed) return [];
  return [{ to: '/laboratory/instruments', words: 'Laboratory' }];
}

const placeOfLetter: Readonly<Record<string, string>> = { c: '/', m: '/materials' };

/** Every place under the running head. */
export function Book() {
  const person = usePerson();
  const { letterKeys } = useSettings();
  const signOut = useSignOut();
  const navigate = useNavigate();
  const { pathname } = useLocation();
  const [listing, setListing] = useState(false);
  const find = useCallback(() => void navigate('/?find=1'), [navigate]);
  const list = useCallback(() => setListing(true), []);
  const go = useCallback(
    (letter: string) => {
      const to = placeOfLetter[letter];
      if (to) void navigate(to);
    },
    [navigate],
  );
  useGlobalKeys({ onFind: find, onListKeys: list, onGo: go, off: !letterKeys });
  const isCurrent = (place: Place) =>
    place.to === '/' ? pathname === '/' || pathname.startsWith('/cases') : pathname.startsWith(place.to);
  return (
    <>
      <RunningHead
        places={placesOf(person)}
        isCurrent={isCurrent}
        findTo="/?find=1"
        person={{ name: person.name, role: person.roles.join(', ') }}
        onSignOut={signOut}
      />
      <Outlet />
      <KeyListDialog open={listing} onOpenChange={setListing} />
    </>
  );
}
