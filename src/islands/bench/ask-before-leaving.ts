/** Has the browser ask before the page is left; gives the way to end that. */
export function askBeforeLeaving(): () => void {
  const ask = (event: BeforeUnloadEvent) => event.preventDefault();
  window.addEventListener('beforeunload', ask);
  return () => window.removeEventListener('beforeunload', ask);
}
