// Runs before the first paint, so that a chosen theme does not flash. Its own file: pages allow no inline script of ours.
try {
  var theme = JSON.parse(localStorage.getItem('longpoint.preferences') || '{}').theme
  if (theme === 'paper' || theme === 'sun' || theme === 'night') document.documentElement.dataset.theme = theme
} catch (_) {
  // Storage refused: the device's own light or dark stands.
}
