/** Puts the reader where a fault is: the field's first control comes into view and takes the focus. */
export function goToField(field: string): void {
  const place = document.querySelector<HTMLElement>(`[data-field="${CSS.escape(field)}"]`);
  place?.closest('details')?.setAttribute('open', '');
  const control = place?.querySelector<HTMLElement>('input, select, textarea, [tabindex="0"], button');
  place?.scrollIntoView({ block: 'center' });
  control?.focus({ preventScroll: true });
}
