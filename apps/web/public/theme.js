// Runs before the first paint, so that nobody who works in the dark sees a white flash.
(function () {
  var choice = null;
  try {
    choice = localStorage.getItem('settlewright.theme');
  } catch {
    // Storage may be blocked; the system's wish is used then.
  }
  var dark = choice === 'dark' || (choice !== 'light' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.dataset.theme = dark ? 'dark' : 'light';
  var tint = document.querySelector('meta[name="theme-color"]');
  if (tint) tint.setAttribute('content', dark ? '#1e1a15' : '#f5efe3');
})();
