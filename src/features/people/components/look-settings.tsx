import type { PersonSettings } from '#shared/contracts/people.ts';
import { useTheme } from '#src/theme/theme.ts';
import { CheckField } from '#src/ui/check-field.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { useOwnActs } from '../api.ts';

const themes = [
  { theme: 'paper', words: 'Daylight', help: 'Porcelain and ink, for the desk.' },
  { theme: 'bench light', words: 'Bench light', help: 'Dark, for the microscope room.' },
] as const;

/** Theme, height of rows and letter keys; each is kept as soon as it is chosen. */
export function LookSettings({ settings }: { settings: PersonSettings }) {
  const { theme, setTheme } = useTheme();
  const { set } = useOwnActs();
  // What was just ticked stands at once; if it is not kept, the box goes back and says why.
  const shown = set.isPending ? { ...settings, ...set.variables } : settings;
  return (
    <div className="mt-3 mb-7 flex flex-col gap-5">
      <fieldset className="flex flex-col gap-2">
        <legend className="field-label">Light</legend>
        {themes.map((offered) => (
          <CheckField
            key={offered.theme}
            type="radio"
            name="theme"
            label={offered.words}
            help={offered.help}
            checked={theme === offered.theme}
            onChange={() => setTheme(offered.theme)}
          />
        ))}
      </fieldset>
      <CheckField
        label="Roomy rows"
        help="Eight pixels more for every row of a table."
        checked={shown.roomyRows}
        onChange={(event) => set.mutate({ roomyRows: event.target.checked })}
      />
      <CheckField
        label="Letters act as keys"
        help="/ finds, ? lists the keys, G and a letter goes to a place. Turn it off if you speak to your machine."
        checked={shown.letterKeys}
        onChange={(event) => set.mutate({ letterKeys: event.target.checked })}
      />
      {set.isError ? <FieldError id="look-error">{set.error.message}</FieldError> : null}
    </div>
  );
}
