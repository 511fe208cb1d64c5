/**
 * Calls back whenever the inks of the page change: light to dark, and to dark ink on paper for printing
 * (the root element carries data-printing meanwhile).
 *
 * @returns a function that ends it
 */
export function onInkChange(redraw: () => void): () => void {
  const dark = matchMedia('(prefers-color-scheme: dark)');
  const before = () => {
    document.documentElement.dataset.printing = '';
    redraw();
  };
  const after = () => {
    delete document.documentElement.dataset.printing;
    redraw();
  };
  dark.addEventListener('change', redraw);
  window.addEventListener('beforeprint', before);
  window.addEventListener('afterprint', after);
  return () => {
    dark.removeEventListener('change', redraw);
    window.removeEventListener('beforeprint', before);
    window.removeEventListener('afterprint', after);
  };
}
