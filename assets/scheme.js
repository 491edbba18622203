// Before the first paint: the scheme that was chosen here, else the system's.
try {
  var scheme = localStorage.getItem('scheme');
  if (scheme === 'light' || scheme === 'dark') document.documentElement.style.colorScheme = scheme;
} catch (e) {
  /* storage may be closed to us; the system's scheme stands */
}
