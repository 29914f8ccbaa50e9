import { Glyph } from './glyph.tsx';

export type TransferShape = 'offered' | 'accepted' | 'refused';

const colour: Record<TransferShape, string> = { offered: 'text-ochre', accepted: 'text-ink', refused: 'text-iron' };

/** Two ends and a line: dashed to an open end, whole, or barred before the end. */
export function TransferGlyph({ transfer }: { transfer: TransferShape }) {
  const isAccepted = transfer === 'accepted';
  return (
    <Glyph width={26} height={12} className={colour[transfer]}>
      <circle cx="4" cy="6" r="3" fill="currentColor" />
      {transfer === 'offered' ? (
        <path d="M8 6H18" stroke="currentColor" strokeWidth="1.5" strokeDasharray="2.5 2" />
      ) : (
        <path d={isAccepted ? 'M7 6H19' : 'M7 6H14.5M16 1.5V10.5'} stroke="currentColor" strokeWidth="1.6" />
      )}
      {isAccepted ? (
        <circle cx="22" cy="6" r="3" fill="currentColor" />
      ) : (
        <circle cx="22" cy="6" r="2.5" stroke="currentColor" strokeWidth="1.3" />
      )}
    </Glyph>
  );
}
