import { Link, useRouteError } from 'react-router-dom';
import { Button } from '../components/ui/button';
import { ApiProblem, ConnectionLost } from '../lib/api/problem';
import { useDocumentTitle } from '../hooks/use-document-title';

interface Words {
  title: string;
  text: string;
  retry: boolean;
}

function wordsFor(error: unknown): Words {
  if (error instanceof ConnectionLost)
    return { title: 'The server cannot be reached', text: error.message, retry: true };
  if (error instanceof ApiProblem && error.status === 404) return NOT_FOUND;
  if (error instanceof ApiProblem) return { title: error.title, text: error.message, retry: true };
  return {
    title: 'This page stopped working',
    text: 'The fault is ours. What the server has acknowledged is kept; load the page again to go on.',
    retry: true,
  };
}

const NOT_FOUND: Words = {
  title: 'There is nothing at this address',
  text: 'It may have been mistyped, or it belongs to an organisation that you do not work for now.',
  retry: false,
};

function PageWords({ title, text, retry }: Words) {
  useDocumentTitle(title);
  return (
    <div className="sheet sheet-main mx-auto mt-8 max-w-prose p-6">
      <h1>{title}</h1>
      <p className="mt-2 text-ink-soft">{text}</p>
      <p className="actions">
        {retry && (
          <Button kind="primary" onClick={() => window.location.reload()}>
            Load again
          </Button>
        )}
        <Link to="/" className="link">
          Go to your first page
        </Link>
      </p>
    </div>
  );
}

/** What a page shows instead of itself when it cannot be shown. */
export function PageError() {
  return <PageWords {...wordsFor(useRouteError())} />;
}

export function NotFound() {
  return <PageWords {...NOT_FOUND} />;
}
