/** Brings something on the page into view, with the keyboard on the first thing in it that can be filled in or tapped. */
export function leadTo(place: HTMLElement | null | undefined): void {
  if (place == null) return;
  const usable = 'input:not(:disabled), select, textarea, button:not([aria-disabled="true"]), a[href]';
  const first = place.matches(usable) ? place : place.querySelector<HTMLElement>(usable);
  place.scrollIntoView({ block: 'center' });
  first?.focus({ preventScroll: true });
}
