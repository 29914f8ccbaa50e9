import { Button } from '#src/ui/button.tsx';

type OlderButtonProps = {
  query: { hasNextPage: boolean; isFetchingNextPage: boolean; fetchNextPage: () => Promise<unknown> };
  what: string;
};

/** Brings the next page of what is listed newest first; nothing where there is none. */
export function OlderButton({ query, what }: OlderButtonProps) {
  if (!query.hasNextPage) return null;
  return (
    <div className="acts mt-3 mb-2">
      <Button disabled={query.isFetchingNextPage} onClick={() => void query.fetchNextPage()}>
        {what}
      </Button>
    </div>
  );
}
