/** The steps of the large view: 1 shows the whole photo. */
export const ZOOM_STEPS = [1, 1.5, 2, 3, 4, 6, 8] as const;

/** The next step larger, or the same at the end. */
export const zoomIn = (zoom: number): number => ZOOM_STEPS.find((step) => step > zoom) ?? zoom;

/** The next step smaller, or the same at the end. */
export const zoomOut = (zoom: number): number => ZOOM_STEPS.findLast((step) => step < zoom) ?? zoom;

export type ViewerAct = 'in' | 'out' | 'fit' | 'previous' | 'next';

/** What a key means in the large view. Arrows turn pages while the whole photo is seen; closer, they move it. */
export function actOfKey(key: string, zoom: number): ViewerAct | null {
  if (key === '+' || key === '=') return 'in';
  if (key === '-' || key === '_') return 'out';
  if (key === '0') return 'fit';
  if (zoom > 1) return null;
  if (key === 'ArrowLeft' || key === 'PageUp') return 'previous';
  if (key === 'ArrowRight' || key === 'PageDown') return 'next';
  return null;
}
