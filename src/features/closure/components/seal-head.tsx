import type { ClosureView } from '#shared/contracts/closure.ts';
import { SealGlyph } from '#src/ui/glyphs/seal-glyph.tsx';

const drawnPx = 124;

/** The drawn seal beside its number. */
export function SealHead({ closure }: { closure: ClosureView }) {
  return (
    <div className="grid grid-cols-[124px_minmax(0,1fr)] items-center gap-7 pb-3 narrow:grid-cols-1 narrow:gap-3">
      <SealGlyph digestHex={closure.rootHash} size={drawnPx} />
      <div>
        <p className="eyebrow">Seal number of the closure</p>
        <p className="mono my-1 text-[25px]/[1.25] font-medium narrow:text-[20px]/[1.25]">{closure.sealNumber}</p>
        <p className="text-s text-ink-2">
          It stands for everything on the list, and for the closure before it. The drawing is made from the seal: two
          seals never draw alike.
        </p>
      </div>
    </div>
  );
}
