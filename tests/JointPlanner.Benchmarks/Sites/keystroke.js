// Types a text into the field of the deck's end and waits until the ledger shows other numbers; gives the milliseconds between.
window.typed = text => new Promise((shown, failed) => {
  const field = document.querySelector('input[data-path="segments/deck/end"]');
  const ledger = document.querySelector('.ledger');
  const before = ledger.textContent;
  const late = setTimeout(() => failed(new Error('no new results within 10 s')), 10000);
  const start = performance.now();
  new MutationObserver((_, observer) => {
    if (ledger.textContent === before) return;
    observer.disconnect();
    clearTimeout(late);
    shown(performance.now() - start);
  }).observe(ledger, { childList: true, subtree: true, characterData: true });
  field.value = text;
  field.dispatchEvent(new Event('input', { bubbles: true }));
});
