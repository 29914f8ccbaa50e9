import type { ReactNode } from 'react';

type ProgressLineProps = {
  label: ReactNode;
  /** Names the bar where `label` is not plain text. */
  name?: string;
  /** Between 0 and 1. */
  share: number;
  /** Done of how much, and the time left in words. */
  amount?: ReactNode;
  /** Under the bar: "Leave this page if you like: they go on arriving." */
  help?: ReactNode;
  failed?: boolean;
};

/** Long work: a bar of 5 px, the amount done of the amount, and the time left in words. */
export function ProgressLine({ label, name, share, amount, help, failed = false }: ProgressLineProps) {
  const percent = Math.round(Math.min(1, Math.max(0, share)) * 100);
  return (
    <div>
      <p className="flex justify-between gap-4">
        <b className="min-w-0 break-words">{label}</b>
        {amount ? <span className="text-ink-2">{amount}</span> : null}
      </p>
      <div
        className={`progress ${failed ? 'is-iron' : ''}`}
        role="progressbar"
        aria-label={name ?? (typeof label === 'string' ? label : 'Progress')}
        aria-valuenow={percent}
        aria-valuemin={0}
        aria-valuemax={100}
      >
        <i style={{ width: `${percent}%` }} />
      </div>
      {help ? <p className={`text-s ${failed ? 'text-iron' : 'text-ink-2'}`}>{help}</p> : null}
    </div>
  );
}
