import { ListIcon } from '@phosphor-icons/react/dist/csr/List';
import { Link } from 'react-router-dom';
import { MenuPlace, MenuRule } from '../ui/menu-entry.tsx';
import { Menu } from '../ui/menu.tsx';
import { PersonEntries, type PersonShown } from './person-menu.tsx';
import type { Place } from './place.ts';

type PlacesMenuProps = { places: readonly Place[]; person: PersonShown | null; onSignOut: () => void };

/** The places and the person's entries under one word, for a narrow screen. */
export function PlacesMenu({ places, person, onSignOut }: PlacesMenuProps) {
  return (
    <Menu
      align="end"
      opener={
        <button type="button" className="places-button">
          <ListIcon size={20} aria-hidden />
          Places
        </button>
      }
    >
      {places.map((place) => (
        <MenuPlace key={place.to}>
          <Link to={place.to}>{place.words}</Link>
        </MenuPlace>
      ))}
      {person ? (
        <>
          <MenuRule />
          <p className="px-3 py-1 text-s text-ink-2">
            {person.name}, {person.role}
          </p>
          <PersonEntries onSignOut={onSignOut} />
        </>
      ) : null}
    </Menu>
  );
}
