import { useEffect } from 'react';

const FOCUSABLE = 'a, button, input, select, textarea, summary, label, [tabindex]';
const DIALOG = '[role="dialog"], [role="alertdialog"]';
const ABOVE = `${DIALOG}, [role="menu"]`;
/** A closed dialog gives the focus back, and a form may lead it on: both come first. */
const PATIENCE_MS = 100;

/** An element with what it stands in, innermost first. */
function pathOf(element: Element | null): Element[] {
  const path: Element[] = [];
  for (let at = element; at; at = at.parentElement) path.push(at);
  return path;
}

/** The heading of the nearest part of the page that still stands. */
function headingFor(path: readonly Element[]): HTMLElement | null {
  for (const place of path) {
    if (!place.isConnected || !place.matches('section, main')) continue;
    const heading = place.querySelector<HTMLElement>('h1, h2, h3');
    if (heading) return heading;
  }
  return document.querySelector<HTMLElement>('main h1');
}

/**
 * Watches the page: where the control that had the focus is taken away by its own work (a step that was taken, a
 * line that was removed), the focus goes to the heading of its part of the page instead of to nowhere.
 */
export function keepFocus(): () => void {
  let path: Element[] = [];
  let waiting: ReturnType<typeof setTimeout> | undefined;
  let above = false;
  const remember = (target: EventTarget | null) => {
    if (!(target instanceof Element)) return;
    above = target.closest(ABOVE) !== null;
    if (above) return;
    path = pathOf(target.closest(FOCUSABLE));
  };
  const onFocus = ({ target }: FocusEvent) => remember(target);
  const onPress = ({ target }: PointerEvent) => remember(target);
  const lead = () => {
    const [last] = path;
    const nowhere = document.activeElement === null || document.activeElement === document.body;
    if (!nowhere || last === undefined || document.querySelector(ABOVE)) return;
    if (last.isConnected && !last.matches(':disabled')) {
      // what stood above the page is closed: back to where it was opened
      if (above && last instanceof HTMLElement) last.focus();
      return;
    }
    const heading = headingFor(path);
    if (!heading) return;
    heading.tabIndex = -1;
    heading.focus({ preventScroll: true });
  };
  const observer = new MutationObserver(() => {
    clearTimeout(waiting);
    waiting = setTimeout(lead, PATIENCE_MS);
  });
  document.addEventListener('focusin', onFocus);
  document.addEventListener('pointerdown', onPress);
  observer.observe(document.body, { childList: true, subtree: true, attributeFilter: ['disabled'] });
  return () => {
    clearTimeout(waiting);
    observer.disconnect();
    document.removeEventListener('focusin', onFocus);
    document.removeEventListener('pointerdown', onPress);
  };
}

/** Keeps the focus on the page, wherever its controls go. */
export function useKeptFocus(): void {
  useEffect(keepFocus, []);
}
