// Before the first paint, so that nobody sees the other theme flash by. A file of its own: the content security policy allows no inline script.
(function () {
  let chosen = null;
  try {
    chosen = localStorage.getItem('dextral.theme');
  } catch {
    // Storage may be forbidden; the system's preference then decides.
  }
  const dark = chosen === 'blueprint' || (chosen !== 'paper' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.dataset.theme = dark ? 'blueprint' : 'paper';
})();
