import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { CalibrationView } from '#shared/contracts/calibrations.ts';
import { mayInLaboratory } from '#shared/rules/may.ts';
import { dayOf } from '#shared/wording/dates.ts';
import { calibrationsQuery, instrumentsQuery } from '#src/features/laboratory/calibrations-api.ts';
import { CalibrationForm } from '#src/features/laboratory/components/calibration-form.tsx';
import { CalibrationTable } from '#src/features/laboratory/components/calibration-table.tsx';
import { InstrumentForm } from '#src/features/laboratory/components/instrument-form.tsx';
import { usePerson } from '#src/http/session.ts';
import { Button } from '#src/ui/button.tsx';
import { EmptyState } from '#src/ui/empty-state.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';

type Open = { kind: 'nothing' } | { kind: 'instrument' } | { kind: 'calibration'; replaces?: CalibrationView };

/** Instruments of the laboratory and the scales kept for them. */
export function Component() {
  const mayRecord = mayInLaboratory(usePerson(), 'record calibrations');
  const instruments = useQuery(instrumentsQuery);
  const calibrations = useQuery(calibrationsQuery);
  const [open, setOpen] = useState<Open>({ kind: 'nothing' });
  const close = () => setOpen({ kind: 'nothing' });
  const isEmpty = calibrations.data?.length === 0 && instruments.data?.length === 0;
  return (
    <Spread shape="single">
      <Page label="Instruments and their scales">
        <RuleHead aside={countWords(calibrations.data)}>Instruments and their scales</RuleHead>
        {calibrations.isPending ? <LoadingState words="Reading calibrations…" /> : null}
        {calibrations.isError ? (
          <ErrorState
            what="The calibrations could not be read."
            why={calibrations.error.message}
            holds="Nothing was lost: what had been kept stands."
            acts={<Button onClick={() => void calibrations.refetch()}>Read them again</Button>}
          />
        ) : null}
        {isEmpty ? (
          <EmptyState>Enter the first instrument; then the scales it is calibrated for are kept here.</EmptyState>
        ) : null}
        {calibrations.data && calibrations.data.length > 0 ? (
          <CalibrationTable
            calibrations={calibrations.data}
            onReplace={mayRecord.allowed ? (replaces) => setOpen({ kind: 'calibration', replaces }) : undefined}
          />
        ) : null}
        {open.kind === 'nothing' && mayRecord.allowed ? (
          <div className="acts mt-5">
            {instruments.data && instruments.data.length > 0 ? (
              <Button kind="main" onClick={() => setOpen({ kind: 'calibration' })}>
                Enter a calibration
              </Button>
            ) : null}
            <Button onClick={() => setOpen({ kind: 'instrument' })}>Enter an instrument</Button>
          </div>
        ) : null}
        {mayRecord.allowed ? null : <p className="mt-5 text-s text-ink-2">{mayRecord.reason}</p>}
        {open.kind === 'instrument' ? <InstrumentForm onDone={close} /> : null}
        {open.kind === 'calibration' ? (
          <CalibrationForm
            key={open.replaces?.id ?? 'new'}
            instruments={instruments.data ?? []}
            replaces={open.replaces}
            today={dayOf(new Date())}
            onDone={close}
          />
        ) : null}
      </Page>
    </Spread>
  );
}

function countWords(calibrations: readonly CalibrationView[] | undefined): string | null {
  if (!calibrations || calibrations.length === 0) return null;
  const inForce = calibrations.filter(({ replacedBy }) => replacedBy === null).length;
  return `${inForce} in force, ${calibrations.length - inForce} replaced`;
}
