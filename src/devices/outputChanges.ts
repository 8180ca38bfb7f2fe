interface OutputChange {
  readonly change: 'gone' | 'new';
  readonly output: string | null;
}

/** iPads call themselves Macs; they never tell when an earpiece is pulled out. */
const isApplePad = (): boolean =>
  /iPad|iPhone/.test(navigator.userAgent) || (/Mac/.test(navigator.platform) && navigator.maxTouchPoints > 1);

/** True where the browser tells when an audio output comes or goes. */
export function tellsOutputChanges(): boolean {
  return navigator.mediaDevices !== undefined && 'ondevicechange' in navigator.mediaDevices && !isApplePad();
}

/**
 * Tells when an audio output comes or goes. Without a permission browsers hide names and even the number of outputs:
 * a change that cannot be told apart counts as "gone", since a prompt out loud in a lesson is worse than a silent one.
 */
export function onOutputChange(listener: (change: OutputChange) => void): () => void {
  if (!tellsOutputChanges()) return () => {};
  const outputs = async (): Promise<MediaDeviceInfo[]> => {
    try {
      return (await navigator.mediaDevices.enumerateDevices()).filter(
        (device) => device.kind === 'audiooutput',
      );
    } catch {
      return [];
    }
  };
  let known = outputs();
  const changed = async (): Promise<void> => {
    const before = await known;
    known = outputs();
    const after = await known;
    const output = after.find((device) => device.label !== '')?.label ?? null;
    listener({ change: after.length > before.length ? 'new' : 'gone', output });
  };
  const listen = (): void => void changed();
  navigator.mediaDevices.addEventListener('devicechange', listen);
  return () => navigator.mediaDevices.removeEventListener('devicechange', listen);
}
