// Before the first paint: the palette this browser was set to. No choice kept means the system's.
try {
  const kept = localStorage.getItem('bendwell:theme');
  if (kept === 'light' || kept === 'dark') document.documentElement.dataset.theme = kept;
} catch {
  // Storage can be switched off; the system's palette then stands.
}
