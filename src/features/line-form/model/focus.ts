/** Brings the reader to a control, or to the first one within a part: the one pressed in, where there is a choice. */
export function focusOn(id: string): void {
  const at = document.getElementById(id);
  if (!at) return;
  const within =
    at.querySelector<HTMLElement>('[aria-pressed="true"]') ??
    at.querySelector<HTMLElement>('input, select, button');
  (within ?? at).focus();
}
