import { changesBetween } from './changes-between.ts';

/** What an act changed: the field, what stood there struck through, what stands there now. */
export function ChangeWords({ before, after }: { before: unknown; after: unknown }) {
  const changes = changesBetween(before, after);
  return changes.map(({ field, before: was, after: is }) => (
    <span key={field} className="mr-3 inline-block">
      {field ? <span className="text-ink-2">{field} </span> : null}
      {was ? (
        <del className="text-ink-3">
          <span className="sr-only">was </span>
          {was}
        </del>
      ) : null}{' '}
      {is}
    </span>
  ));
}
