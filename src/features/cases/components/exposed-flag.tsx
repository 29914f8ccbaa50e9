import { ExposedGlyph } from '#src/ui/glyphs/exposed-glyph.tsx';

/** On top of the case while someone may be exposed. */
export function ExposedFlag() {
  return (
    <div className="note is-iron mb-4 grid grid-cols-[22px_1fr] gap-3" role="status">
      <ExposedGlyph />
      <div>
        <p>
          <b>Someone may be exposed now.</b>
        </p>
        <p className="mt-1 text-s text-ink-2">If someone may be hurt today, telephone. Do not wait for this page.</p>
      </div>
    </div>
  );
}
