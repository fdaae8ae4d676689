/**
 * jsdom knows the dialog element but not how to show it. What the screens rely on, by the HTML
 * standard: showing sets `open` and moves focus to the first thing that takes it; closing clears `open`.
 */
HTMLDialogElement.prototype.showModal = function showModal(this: HTMLDialogElement) {
  this.open = true;
  this.querySelector<HTMLElement>("button, [href], input, select, textarea")?.focus();
};
HTMLDialogElement.prototype.close = function close(this: HTMLDialogElement) {
  this.open = false;
};
