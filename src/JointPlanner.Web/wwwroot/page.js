// The little that the server cannot do: remember two choices in this browser, and lead from a drawn thing to its column.
window.jointPlanner = {
  remember: (name, value) => { document.cookie = `${name}=${value}; Path=/; Max-Age=31536000; SameSite=Lax`; },
  paper: value => { document.documentElement.dataset.theme = value; window.jointPlanner.remember('paper', value); },
};
document.addEventListener('click', event => {
  const drawn = event.target.closest?.('.picture [data-path]');
  if (!drawn) return;
  const column = document.querySelector(`[data-column="${CSS.escape(drawn.dataset.path)}"]`);
  if (!column) return;
  column.scrollIntoView({ block: 'nearest', inline: 'center' });
  (column.querySelector('input, button, a') ?? column).focus();
});
