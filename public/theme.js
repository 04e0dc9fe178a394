// Sets the kept theme before the first paint; src/hooks/use-theme.ts keeps it from there on.
try {
  var kept = localStorage.getItem('counterpoise-theme');
  if (kept === 'light' || kept === 'dark') document.documentElement.dataset.theme = kept;
} catch {
  // Storage may be closed to us; the system's preference then holds.
}
