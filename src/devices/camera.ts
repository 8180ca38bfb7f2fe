import { drawn, type PictureData } from './pixelsOf.ts';

export interface OpenCamera {
  frame(edge: number): PictureData | null;
  lost(): boolean;
  stop(): void;
}

/** Opens the camera at the back and shows what it sees in the element. What stands in the way is a value. */
export async function openCamera(
  shown: HTMLVideoElement,
): Promise<OpenCamera | 'refused' | 'missing' | 'busy'> {
  // Absent where the address is no secure one.
  const media = navigator.mediaDevices as MediaDevices | undefined;
  if (media?.getUserMedia === undefined) return 'missing';
  let stream: MediaStream;
  try {
    stream = await media.getUserMedia({
      audio: false,
      video: { facingMode: 'environment', width: { ideal: 1920 }, height: { ideal: 1080 } },
    });
  } catch (error) {
    const why = error instanceof Error ? error.name : '';
    if (why === 'NotAllowedError' || why === 'SecurityError') return 'refused';
    return why === 'NotFoundError' || why === 'OverconstrainedError' ? 'missing' : 'busy';
  }
  const stop = (): void => {
    for (const track of stream.getTracks()) track.stop();
    shown.srcObject = null;
  };
  shown.srcObject = stream;
  shown.muted = true;
  try {
    await shown.play();
  } catch {
    // Taken out of the page meanwhile, or the tablet lets no picture run.
    stop();
    return 'busy';
  }
  return {
    frame: (edge) => {
      const [width, height] = [shown.videoWidth, shown.videoHeight];
      const side = Math.min(width, height);
      if (side === 0 || shown.readyState < HTMLMediaElement.HAVE_CURRENT_DATA) return null;
      const from = { x: (width - side) / 2, y: (height - side) / 2, width: side, height: side };
      return drawn(shown, from, edge);
    },
    lost: () => stream.getVideoTracks().every((track) => track.readyState === 'ended'),
    stop,
  };
}
