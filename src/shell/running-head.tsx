import { MagnifyingGlassIcon } from '@phosphor-icons/react/dist/csr/MagnifyingGlass';
import { Link, NavLink } from 'react-router-dom';
import { ProductMark } from '../ui/glyphs/product-mark.tsx';
import { PersonMenu, type PersonShown } from './person-menu.tsx';
import type { Place } from './place.ts';
import { PlacesMenu } from './places-menu.tsx';

type RunningHeadProps = {
  places: readonly Place[];
  /** Whether the address belongs to a place: a case belongs to the Casebook. Decided by the router where left out. */
  isCurrent?: (place: Place) => boolean;
  /** Where the find link leads; none for visitors. */
  findTo?: string;
  person: PersonShown | null;
  onSignOut: () => void;
};

/** The slim head of every place: product mark, places, find, person. Places fold into a menu on a narrow screen. */
export function RunningHead({ places, isCurrent, findTo, person, onSignOut }: RunningHeadProps) {
  return (
    <>
      <a className="skip-link" href="#content">
        Skip to the page
      </a>
      <header className="running-head">
        <Link className="product" to="/">
          <ProductMark />
          Hacklebook
        </Link>
        <nav aria-label="Places" className="places">
          {places.map((place) => (
            <PlaceLink key={place.to} place={place} current={isCurrent?.(place)} />
          ))}
        </nav>
        {findTo ? <FindLink to={findTo} /> : <span className="ml-auto" />}
        <PlacesMenu places={places} person={person} onSignOut={onSignOut} />
        {person ? <PersonMenu person={person} onSignOut={onSignOut} /> : null}
      </header>
    </>
  );
}

function PlaceLink({ place, current }: { place: Place; current?: boolean }) {
  if (current === undefined) {
    return (
      <NavLink to={place.to} end={place.to === '/'}>
        {place.words}
      </NavLink>
    );
  }
  return (
    <Link to={place.to} aria-current={current ? 'page' : undefined}>
      {place.words}
    </Link>
  );
}

function FindLink({ to }: { to: string }) {
  return (
    <Link className="find" to={to} aria-label="Find a case" title="Find a case" aria-keyshortcuts="/">
      <span className="find-line">
        <MagnifyingGlassIcon size={16} aria-hidden />
        <span>Find a case</span>
        <kbd aria-hidden>/</kbd>
      </span>
      <MagnifyingGlassIcon size={20} aria-hidden />
    </Link>
  );
}
