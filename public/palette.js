// Puts the reader's own palette on the page while the rest is still loading.
try {
  const palette = localStorage.getItem('ringtrue.palette');
  if (palette === 'day' || palette === 'night') document.documentElement.dataset.palette = palette;
} catch {
  // Storage refused: the page follows the system.
}
