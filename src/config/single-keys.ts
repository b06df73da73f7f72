const STORAGE_KEY = 'groundsill.single-keys';
const CHANGED = 'groundsill:single-keys';

/** Whether keys pressed alone, such as J and K, do something; who speaks to the computer turns them off. */
export function singleKeysAreOn(): boolean {
  return localStorage.getItem(STORAGE_KEY) !== 'off';
}

export function setSingleKeys(on: boolean): void {
  localStorage.setItem(STORAGE_KEY, on ? 'on' : 'off');
  window.dispatchEvent(new Event(CHANGED));
}

/** Calls back when the setting changes, here or in another window. */
export function onSingleKeysChange(callback: () => void): () => void {
  window.addEventListener(CHANGED, callback);
  window.addEventListener('storage', callback);
  return () => {
    window.removeEventListener(CHANGED, callback);
    window.removeEventListener('storage', callback);
  };
}
