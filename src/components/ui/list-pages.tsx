import { Link } from 'react-router-dom';

interface ListPagesProps {
  page: { items: readonly unknown[]; total?: number; nextCursor: string | null };
  controls: { view: { cursor: string | null }; pageHref: (cursor: string | null) => string };
}

/** How much of a list is shown, and the ways to its first and its next page. */
export function ListPages({ page, controls }: ListPagesProps) {
  const shown = page.items.length;
  return (
    <p className="flex flex-wrap gap-x-4 gap-y-1 text-ink-soft">
      <span>
        {page.total === undefined ? `${shown} shown` : `${shown} of ${page.total} shown`}. This view is kept
        in the page’s address.
      </span>
      {controls.view.cursor !== null && (
        <Link className="link" to={controls.pageHref(null)}>
          First page
        </Link>
      )}
      {page.nextCursor !== null && (
        <Link className="link" to={controls.pageHref(page.nextCursor)}>
          Next page
        </Link>
      )}
    </p>
  );
}
