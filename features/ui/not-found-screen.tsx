import { EmptyState } from './empty-state';
import { ButtonLink } from './link';
import { Screen } from './screen';

/** For an address that leads nowhere. */
export function NotFoundScreen() {
  return (
    <Screen title="Nothing here">
      <EmptyState
        icon="search"
        title="This address leads nowhere"
        action={<ButtonLink kind="primary" label="To the start" href="/" />}
      >
        It may have been copied in part, or what it led to has been removed.
      </EmptyState>
    </Screen>
  );
}
