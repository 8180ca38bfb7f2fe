import { useEffect, useRef, useState } from 'react';
import { Button } from '../../../ui/Button.tsx';
import { Notice } from '../../../ui/Notice.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { type Camera, type Pixels, useServices } from '../../services.ts';

/** Side of the square that is looked through: some eight pixels for each module of the largest code. */
const edge = 900;
/** Between two looks: enough for touches to come through while a slow tablet searches. */
const restMs = 120;

/** True when there is nothing more to look for. */
type OnFrame = (pixels: Pixels) => Promise<boolean>;

/** The quickest way: the camera looks until the whole card is read. */
export function CameraWay({ onFrame }: { readonly onFrame: OnFrame }) {
  const { words } = useServices();
  const [open, setOpen] = useState(false);
  const [said, setSaid] = useState<string | null>(null);
  return (
    <Sheet title={words.pairing.camera}>
      <div className="stack-tight">
        <p className="second">{words.pairing.cameraText}</p>
        {said !== null && <Notice kind="hold">{said}</Notice>}
        {open ? (
          <Looking
            onFrame={onFrame}
            onCannot={(why) => {
              setSaid(why);
              setOpen(false);
            }}
            onClose={() => setOpen(false)}
          />
        ) : (
          <div>
            <Button
              look="main"
              onClick={() => {
                setSaid(null);
                setOpen(true);
              }}
            >
              {words.pairing.cameraOpen}
            </Button>
          </div>
        )}
      </div>
    </Sheet>
  );
}

interface LookingProps {
  readonly onFrame: OnFrame;
  readonly onCannot: (why: string) => void;
  readonly onClose: () => void;
}

function Looking({ onFrame, onCannot, onClose }: LookingProps) {
  const { words, device } = useServices();
  const video = useRef<HTMLVideoElement>(null);
  const [opened, setOpened] = useState(false);
  const latest = useRef({ onFrame, onCannot });
  useEffect(() => {
    latest.current = { onFrame, onCannot };
  });
  useEffect(() => {
    const shown = video.current;
    if (shown === null) return;
    let here = true;
    let camera: Camera | null = null;
    let rest = (): void => undefined;
    const look = async (): Promise<void> => {
      if (!here || camera === null) return;
      if (camera.lost()) return latest.current.onCannot(words.pairing.cameraBusy);
      const pixels = camera.frame(edge);
      if (pixels !== null && (await latest.current.onFrame(pixels))) return;
      if (here) rest = device.wakeIn(restMs, () => void look());
    };
    void device.openCamera(shown).then((answer) => {
      if (typeof answer === 'string') {
        const why = {
          refused: words.pairing.cameraRefused,
          missing: words.pairing.cameraMissing,
          busy: words.pairing.cameraBusy,
        }[answer];
        if (here) latest.current.onCannot(why);
        return;
      }
      if (!here) return answer.stop();
      camera = answer;
      setOpened(true);
      void look();
    });
    return () => {
      here = false;
      rest();
      camera?.stop();
    };
  }, [device, words]);
  return (
    <>
      {/* biome-ignore lint/a11y/useMediaCaption: what a camera sees has no words */}
      <video ref={video} className="card-camera" playsInline aria-label={words.pairing.cameraView} />
      <div className="row">
        <p className="grow second small" role="status">
          {opened ? words.pairing.cameraLook : words.pairing.cameraOpening}
        </p>
        <Button onClick={onClose}>{words.pairing.cameraStop}</Button>
      </div>
    </>
  );
}
