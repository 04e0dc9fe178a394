import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { useDocumentTitle } from '../../hooks/use-document-title';

interface PageHeadProps {
  title: string;
  /** The places above this one, and the page's own short name last. */
  crumbs?: readonly { label: string; to?: string }[];
  lead?: ReactNode;
  actions?: ReactNode;
  /** The title block, or whatever stands at the right. */
  block?: ReactNode;
  /** The name in the browser's tab, where it should say more than the heading. */
  documentTitle?: string;
}

/** The head of a page: where one is, what it is, what is to do next; the title block at the right. */
export function PageHead({ title, crumbs, lead, actions, block, documentTitle }: PageHeadProps) {
  useDocumentTitle(documentTitle ?? title);
  return (
    <div className="page-head">
      <div className="page-head-words">
        {crumbs && (
          <nav className="crumb" aria-label="Where you are">
            {crumbs.map((crumb, i) => (
              <span key={crumb.label}>
                {i > 0 && ' / '}
                {crumb.to ? (
                  <Link to={crumb.to} className="link">
                    {crumb.label}
                  </Link>
                ) : (
                  crumb.label
                )}
              </span>
            ))}
          </nav>
        )}
        <h1>{title}</h1>
        {lead && <p className="lead">{lead}</p>}
        {actions && <div className="actions">{actions}</div>}
      </div>
      {block}
    </div>
  );
}
