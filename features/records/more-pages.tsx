import { problemOf, problemWords } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { Notice } from '@/features/ui/notice';

interface MorePagesProps {
  query: {
    hasNextPage: boolean;
    isFetchingNextPage: boolean;
    isFetchNextPageError: boolean;
    error: unknown;
    fetchNextPage: () => unknown;
  };
  label: string;
}

/** Under a list that goes on: the next page, or why it did not come. */
export function MorePages({ query, label }: MorePagesProps) {
  const next = (
    <Button label={label} busy={query.isFetchingNextPage} onPress={query.fetchNextPage} />
  );
  if (query.isFetchNextPageError)
    return (
      <Notice kind="error" action={next}>
        {problemWords(problemOf(query.error))}
      </Notice>
    );
  return query.hasNextPage ? next : null;
}

interface LoadProblemProps {
  error: unknown;
  onRetry: () => unknown;
}

/** In place of what could not be fetched. */
export function LoadProblem({ error, onRetry }: LoadProblemProps) {
  return (
    <Notice kind="error" action={<Button label="Try again" onPress={() => void onRetry()} />}>
      {problemWords(problemOf(error))}
    </Notice>
  );
}
