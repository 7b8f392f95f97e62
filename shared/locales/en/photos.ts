/** Photos: taking one, its small and its large view. */
export default {
  thumb: {
    open: 'Show large: {name}',
    noPreview: 'No preview',
    unsent: 'Not yet sent',
  },
  viewer: {
    title: 'Photo {number} of {total}',
    close: 'Close',
    zoomIn: 'Larger',
    zoomOut: 'Smaller',
    fit: 'Whole',
    previous: 'Previous',
    next: 'Next',
    zoomed: '{percent} % of the screen',
    loadingOriginal: 'The original is being opened.',
    original: 'Original',
    preview: 'Preview',
    originalMissing: 'The original cannot be opened now. The preview is shown.',
    nothingToShow: 'This photo cannot be shown here.',
    keys: 'Keys: plus and minus for the size, 0 for the whole photo, arrows to move, Escape to close.',
  },
} as const;
