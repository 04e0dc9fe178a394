/** The letter of a revision in its triangle: ink for the current one, softer for older ones. */
export function RevisionTriangle({ letter, older = false }: { letter: string; older?: boolean }) {
  return (
    <svg
      className={older ? 'revision revision-older' : 'revision'}
      viewBox="0 0 24 22"
      role="img"
      aria-label={`Revision ${letter}`}
    >
      <path d="M12 1.2 23 20.6H1Z" />
      <text x={12} y={17.6} textLength={letter.length > 1 ? 12 : undefined} lengthAdjust="spacingAndGlyphs">
        {letter}
      </text>
    </svg>
  );
}
