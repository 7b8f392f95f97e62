// Runs before the first paint, so that the night theme never starts with a white flash.
(function () {
  let wish = null;
  try {
    wish = localStorage.getItem('headfast.theme');
  } catch {
    // Storage can be barred; the system's choice stands then.
  }
  const night = wish === 'night' || (wish !== 'day' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.dataset.theme = night ? 'night' : 'day';
})();
