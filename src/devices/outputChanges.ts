import type { Stop } from '../recorder/ports.ts';

/**
 * True where the browser tells when an earpiece is pulled out. Tablets say nothing of the kind: a browser that lets a
 * page choose its output (desktop Chromium) also tells when one goes.
 */
export function tellsOutputChanges(): boolean {
  return (
    typeof navigator !== 'undefined' &&
    navigator.mediaDevices !== undefined &&
    'ondevicechange' in navigator.mediaDevices &&
    typeof AudioContext !== 'undefined' &&
    'setSinkId' in AudioContext.prototype
  );
}

/**
 * Calls back when an output comes or goes. Without permission for the microphone browsers list no more than one output
 * and no names; a change of which nobody can say what it was counts as "gone", since silence is the safe side.
 */
export function watchOutputs(tell: (change: 'gone' | 'new') => void): Stop {
  if (!tellsOutputChanges()) return () => undefined;
  const devices = navigator.mediaDevices;
  const count = async (): Promise<number> => {
    const list = await devices.enumerateDevices().catch(() => []);
    return list.filter((device) => device.kind === 'audiooutput').length;
  };
  let before = count();
  const changed = (): void => {
    before = Promise.all([before, count()]).then(([was, is]) => {
      tell(is > was ? 'new' : 'gone');
      return is;
    });
  };
  devices.addEventListener('devicechange', changed);
  return () => devices.removeEventListener('devicechange', changed);
}
