import { ApiProblem } from '../../lib/api/problem';
import { Notice } from './notice';

interface ProblemNoticeProps {
  /** What went wrong; nothing is shown without one. */
  error: Error | null | undefined;
  className?: string;
}

/** A refusal in the server's own words: what happened, what changed meanwhile, which entries are at fault. */
export function ProblemNotice({ error, className }: ProblemNoticeProps) {
  if (!error) return null;
  const body = error instanceof ApiProblem ? error.body : null;
  const lines = [...(body?.changed ?? []), ...(body?.errors ?? []).map((fault) => fault.message)];
  return (
    <Notice grade="must-answer" announce title={body?.title} className={className}>
      {error.message !== body?.title && <p>{error.message}</p>}
      {lines.length > 0 && (
        <ul className="mt-1 list-disc pl-4">
          {lines.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
      )}
    </Notice>
  );
}
