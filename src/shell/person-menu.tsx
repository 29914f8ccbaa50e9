import { CaretDownIcon } from '@phosphor-icons/react/dist/csr/CaretDown';
import { Link } from 'react-router-dom';
import { useTheme } from '../theme/theme.ts';
import { MenuEntry, MenuPlace, MenuRule } from '../ui/menu-entry.tsx';
import { Menu } from '../ui/menu.tsx';

export type PersonShown = { name: string; role: string };

/** Own settings, the theme and the way out: the entries shared by the person's menu and the folded one. */
export function PersonEntries({ onSignOut }: { onSignOut: () => void }) {
  const { theme, setTheme } = useTheme();
  const other = theme === 'paper' ? 'bench light' : 'paper';
  return (
    <>
      <MenuPlace>
        <Link to="/me">Your settings</Link>
      </MenuPlace>
      <MenuEntry onChosen={() => setTheme(other)}>
        {other === 'paper' ? 'Turn to daylight' : 'Turn to bench light'}
      </MenuEntry>
      <MenuRule />
      <MenuEntry onChosen={onSignOut}>Sign out</MenuEntry>
    </>
  );
}

/** Name and role at the right of the head, opening own settings, the theme and the way out. */
export function PersonMenu({ person, onSignOut }: { person: PersonShown; onSignOut: () => void }) {
  return (
    <Menu
      align="end"
      opener={
        <button type="button" className="person">
          {person.name} <em>{person.role}</em>
          <CaretDownIcon size={12} aria-hidden />
        </button>
      }
    >
      <PersonEntries onSignOut={onSignOut} />
    </Menu>
  );
}
