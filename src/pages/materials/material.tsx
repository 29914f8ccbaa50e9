import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { mayInLaboratory } from '#shared/rules/may.ts';
import { constantKindTable, type ConstantKind } from '#shared/vocabulary/constant-kinds.ts';
import { dayOf } from '#shared/wording/dates.ts';
import { materialOf } from '#src/features/materials/api.ts';
import { ConstantForm } from '#src/features/materials/components/constant-form.tsx';
import { ConstantsTable } from '#src/features/materials/components/constants-table.tsx';
import { RecordsOfKind } from '#src/features/materials/components/records-of-kind.tsx';
import { inForceOn } from '#src/features/materials/records-over-time.ts';
import { Refusal } from '#src/http/api.ts';
import { usePerson } from '#src/http/session.ts';
import { Button } from '#src/ui/button.tsx';
import { Caution } from '#src/ui/caution.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';
import { NothingHere } from '../nothing-here.tsx';

/** One material: its constants as they stood on a day, and the records of one of them over time. */
export function Component() {
  const { materialId = '' } = useParams();
  const person = usePerson();
  const material = useQuery(materialOf(materialId));
  const [chosen, setChosen] = useState<ConstantKind>('toughness');
  const [onDay, setOnDay] = useState<string | null>(null);
  const [recording, setRecording] = useState(false);
  if (material.isPending) return <LoadingState words="Reading the material…" />;
  if (material.isError)
    return material.error instanceof Refusal && ['not-found', 'not-valid'].includes(material.error.body.code) ? (
      <NothingHere />
    ) : (
      <ErrorState what="The material could not be read." why={material.error.message} />
    );
  const { name, family, grainSizeUm, route, constants, asOf } = material.data;
  const today = dayOf(new Date(asOf));
  const ofKind = constants.filter(({ kind }) => kind === chosen);
  const mayRecord = mayInLaboratory(person, 'record constants');
  const choose = (kind: ConstantKind) => {
    setRecording(false);
    setChosen(kind);
  };
  return (
    <main id="content">
      <header className="case-head">
        <h1>{name}</h1>
        <div className="case-facts">
          <span>
            family <b>{family}</b>
          </span>
          {grainSizeUm === null ? null : (
            <span>
              grain <b>{grainSizeUm}&nbsp;µm</b>
            </span>
          )}
          {route ? <span>{route}</span> : null}
        </div>
      </header>
      <Spread shape="even">
        <Page label="Constants" folio={{ chapter: 'i', words: 'Constants in force', side: 'left' }}>
          <RuleHead
            aside={
              <>
                <var>k</var> = 2
              </>
            }
          >
            Constants
          </RuleHead>
          <p className="filter-sentence mb-2">
            As they stood on{' '}
            <input
              type="date"
              aria-label="Day"
              className="choice bg-transparent"
              value={onDay ?? today}
              max={today}
              onChange={(event) => setOnDay(event.target.value === '' ? null : event.target.value)}
            />
            .
          </p>
          <ConstantsTable constants={inForceOn(constants, onDay ?? today)} chosen={chosen} onChosen={choose} />
          <div className="mt-8">
            <Caution lead="For reading broken pieces.">
              Values with stated limits; not an allowable for design. The inner and outer constants are never exchanged:
              a mirror read to one boundary refuses the other’s constant.
            </Caution>
          </div>
        </Page>
        <Page label="History and reach" folio={{ chapter: 'i', words: 'History and reach', side: 'right' }}>
          <RecordsOfKind kind={chosen} records={ofKind} today={today} />
          {recording ? (
            <ConstantForm
              key={chosen}
              materialId={materialId}
              kind={chosen}
              inForce={ofKind.find(({ supersededById }) => supersededById === null) ?? null}
              today={today}
              onLeave={() => setRecording(false)}
            />
          ) : (
            <div className="acts mt-4">
              <Button
                kind="main"
                closedBecause={mayRecord.allowed ? null : mayRecord.reason}
                onClick={() => setRecording(true)}
              >
                Record {ofKind.length === 0 ? 'the' : 'another'} {constantKindTable[chosen].word}
              </Button>
            </div>
          )}
        </Page>
      </Spread>
    </main>
  );
}
