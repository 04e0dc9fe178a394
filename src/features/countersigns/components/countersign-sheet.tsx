import type { Countersign } from '#shared/contracts/api.generated';
import { Sheet } from '../../../components/ui/sheet';
import { useSession } from '../../../lib/api/session';
import { usePendingCountersigns } from '../api/list-countersigns';
import { CountersignItem } from './countersign-item';

/** Proposals that wait for a second reviewer; nothing where none does. */
export function CountersignSheet({ items }: { items: readonly Countersign[] }) {
  const session = useSession();
  if (items.length === 0 || session === null) return null;
  return (
    <Sheet
      title={
        items.length === 1
          ? 'One proposal waits for a second reviewer'
          : `${items.length} proposals wait for a second reviewer`
      }
      className="mb-6"
    >
      <ul className="countersigns">
        {items.map((item) => (
          <CountersignItem
            key={item.id}
            item={item}
            userId={session.user.id}
            mayDecide={session.role === 'reviewer'}
          />
        ))}
      </ul>
    </Sheet>
  );
}

/** The same over all applications, for the queue. */
export function PendingCountersigns() {
  return <CountersignSheet items={usePendingCountersigns()} />;
}
