// Runs before the first paint so that a dark page never flashes white. A file of its own: the page's
// content policy allows no inline script. The key is the one the theme provider writes.
(function () {
  var chosen;
  try {
    chosen = localStorage.getItem('stageyard-scheme');
  } catch {
    // Storage is barred: the system decides.
  }
  var dark = chosen === 'dark' || (chosen !== 'light' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.setAttribute('data-scheme', dark ? 'dark' : 'light');
  document.documentElement.style.backgroundColor = dark ? '#14191a' : '#f6f4ee';
})();
