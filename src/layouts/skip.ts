/** Moves the reading position past the masthead without touching the address, which holds the whole sheet. */
document.addEventListener('click', (event) => {
  if (!(event.target instanceof Element) || !event.target.matches('a.skip')) return;
  event.preventDefault();
  document.getElementById('main')?.focus();
});
