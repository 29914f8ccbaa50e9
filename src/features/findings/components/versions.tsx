import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { formatInstant } from '#shared/wording/dates.ts';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useFindingsActs, versionsOf } from '../api.ts';

type VersionsProps = { number: string; mayKeep: boolean; mayWrite: boolean };

/** The named versions of the text, and the keeping of one. */
export function Versions({ number, mayKeep, mayWrite }: VersionsProps) {
  const { data: versions = [] } = useQuery(versionsOf(number));
  const { keepVersion } = useFindingsActs(number);
  const [name, setName] = useState<string | null>(null);
  const keep = () => {
    if (name !== null) keepVersion.mutate(name, { onSuccess: () => setName(null) });
  };
  return (
    <>
      {versions.length === 0 ? <p className="text-s text-ink-2">None named yet.</p> : null}
      <ol className="text-s text-ink-2">
        {versions.slice(0, 4).map((version) => (
          <li key={version.id}>
            <span className="text-ink">
              {version.number}, {version.name}
            </span>{' '}
            {version.madeBy.name}, {formatInstant(version.madeAt)}
          </li>
        ))}
      </ol>
      {mayWrite && name === null ? (
        <button type="button" className="button is-plain is-small" onClick={() => setName('')}>
          Keep a version
        </button>
      ) : null}
      {mayWrite && name !== null ? (
        <form
          className="mt-2 grid gap-2"
          onSubmit={(event) => {
            event.preventDefault();
            keep();
          }}
        >
          <TextField
            label="Name of the version"
            value={name}
            maxLength={120}
            onChange={(event) => setName(event.target.value)}
          />
          {keepVersion.error ? <FieldError id="version-fault">{keepVersion.error.message}</FieldError> : null}
          <Button
            small
            type="submit"
            disabled={keepVersion.isPending}
            closedBecause={mayKeep ? undefined : 'Opens once all that is written is kept.'}
          >
            Keep this version
          </Button>
        </form>
      ) : null}
    </>
  );
}
