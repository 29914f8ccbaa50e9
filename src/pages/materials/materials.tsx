import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { mayInLaboratory } from '#shared/rules/may.ts';
import { asSentence, counted } from '#shared/wording/number-words.ts';
import { materialsQuery } from '#src/features/materials/api.ts';
import { MaterialForm } from '#src/features/materials/components/material-form.tsx';
import { MaterialsTable } from '#src/features/materials/components/materials-table.tsx';
import { usePerson } from '#src/http/session.ts';
import { Button } from '#src/ui/button.tsx';
import { EmptyState } from '#src/ui/empty-state.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';

/** The materials whose constants the estimates rest on. */
export function Component() {
  const person = usePerson();
  const navigate = useNavigate();
  const materials = useQuery(materialsQuery);
  const [entering, setEntering] = useState(false);
  const mayEnter = mayInLaboratory(person, 'enter materials').allowed;
  const done = (id: string | null) => (id === null ? setEntering(false) : void navigate(`/materials/${id}`));
  return (
    <main id="content" className="px-edge pb-6">
      <div className="page-head">
        <div>
          <h1>Materials</h1>
          <p className="lead">
            {materials.data ? `${asSentence(counted(materials.data.length, 'material'))}. ` : ''}A constant holds with
            its source and its ±, from a day on.
          </p>
        </div>
        {mayEnter && !entering ? (
          <Button kind="main" onClick={() => setEntering(true)}>
            Enter a material
          </Button>
        ) : null}
      </div>
      {entering ? <MaterialForm onDone={done} /> : null}
      {materials.isPending ? <LoadingState words="Reading the materials…" /> : null}
      {materials.isError ? <ErrorState what="The materials could not be read." why={materials.error.message} /> : null}
      {materials.data && materials.data.length > 0 ? <MaterialsTable materials={materials.data} /> : null}
      {materials.data?.length === 0 && !entering ? (
        <EmptyState>No material has been entered yet. Enter the first, then record its constants.</EmptyState>
      ) : null}
    </main>
  );
}
