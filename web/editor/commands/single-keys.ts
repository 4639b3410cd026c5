const key = 'dropwatt.single-keys';

/** Whether single letters act as shortcuts; speech input users may want them off (WCAG 2.1.4). */
export function singleKeysOn(): boolean {
  try {
    return localStorage.getItem(key) !== 'off';
  } catch {
    return true;
  }
}

export function setSingleKeys(on: boolean): void {
  try {
    localStorage.setItem(key, on ? 'on' : 'off');
  } catch {
    // Without storage the choice cannot be kept.
  }
}
