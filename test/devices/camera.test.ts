// @vitest-environment happy-dom
import { afterEach, expect, it, vi } from 'vitest';
import { openCamera } from '../../src/devices/camera.ts';

afterEach(() => vi.unstubAllGlobals());

/** A stream of one track, as much of it as the adapter touches. */
function streamOf(track: { readyState: string; stop: () => void }) {
  return { getTracks: () => [track], getVideoTracks: () => [track] } as unknown as MediaStream;
}

function tablet(getUserMedia: (wish: MediaStreamConstraints) => Promise<MediaStream>) {
  vi.stubGlobal('navigator', { mediaDevices: { getUserMedia } });
}

/** Shows what it is given, or cannot. */
function screenThat(play: () => Promise<void>): HTMLVideoElement {
  return {
    play,
    srcObject: null,
    videoWidth: 0,
    videoHeight: 0,
    readyState: 0,
  } as unknown as HTMLVideoElement;
}

it.each([
  ['NotAllowedError', 'refused'],
  ['SecurityError', 'refused'],
  ['NotFoundError', 'missing'],
  ['OverconstrainedError', 'missing'],
  ['NotReadableError', 'busy'],
  ['AbortError', 'busy'],
])('tells %s as %s', async (name, said) => {
  tablet(async () => {
    throw new DOMException('', name);
  });
  expect(await openCamera(screenThat(async () => {}))).toBe(said);
});

it('is missing where the page is not a secure one', async () => {
  vi.stubGlobal('navigator', {});
  expect(await openCamera(screenThat(async () => {}))).toBe('missing');
});

it('asks for the camera at the back and for no sound, and gives it back', async () => {
  const wishes: MediaStreamConstraints[] = [];
  const track = {
    readyState: 'live',
    stop: () => {
      track.readyState = 'ended';
    },
  };
  tablet(async (wish) => {
    wishes.push(wish);
    return streamOf(track);
  });
  const shown = screenThat(async () => {});
  const camera = await openCamera(shown);
  if (typeof camera === 'string') throw new Error(camera);
  expect(wishes).toMatchObject([{ audio: false, video: { facingMode: 'environment' } }]);
  expect([camera.lost(), camera.frame(900)]).toEqual([false, null]);
  camera.stop();
  expect([track.readyState, camera.lost(), shown.srcObject]).toEqual(['ended', true, null]);
});

it('gives it back when its picture cannot be shown', async () => {
  let stopped = 0;
  tablet(async () => streamOf({ readyState: 'live', stop: () => stopped++ }));
  const answer = await openCamera(
    screenThat(async () => {
      throw new DOMException('', 'AbortError');
    }),
  );
  expect([answer, stopped]).toEqual(['busy', 1]);
});
