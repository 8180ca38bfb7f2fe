import { useEffect, useState } from 'react';
import { keyName, mayMean } from '../../../model/keyMap.ts';
import type { KeyAction, KeyMap } from '../../../model/observer.ts';
import { Button } from '../../../ui/Button.tsx';
import { Dialog } from '../../../ui/Dialog.tsx';
import { Notice } from '../../../ui/Notice.tsx';
import { useWords } from '../../services.ts';
import { actionLabel } from './keyActions.ts';

interface Props {
  readonly action: KeyAction;
  readonly map: KeyMap;
  readonly onKey: (key: string) => void;
  readonly onClose: () => void;
}

/** Waits for one key. A key that has a meaning, or that the page needs, is refused with a sentence. */
export function PressKey({ action, map, onKey, onClose }: Props) {
  const words = useWords();
  const { study } = words;
  const [refusal, setRefusal] = useState<string | null>(null);
  useEffect(() => {
    const pressed = (event: KeyboardEvent) => {
      // Moving to the button and leaving the dialog stay possible.
      if (['Escape', 'Tab'].includes(event.key)) return;
      if (event.ctrlKey || event.metaKey || event.altKey || event.key === 'Shift') return;
      if (['Enter', ' '].includes(event.key) && event.target instanceof HTMLButtonElement) return;
      event.preventDefault();
      const key = keyName(event.key);
      const label = study.keyLabel({ key });
      const taken = Object.hasOwn(map.keys, key) ? map.keys[key] : undefined;
      if (!mayMean(key)) setRefusal(study.keyKept({ key: label }));
      else if (taken !== undefined)
        setRefusal(study.keyTaken({ key: label, action: actionLabel(words, taken) }));
      else onKey(key);
    };
    document.addEventListener('keydown', pressed);
    return () => document.removeEventListener('keydown', pressed);
  }, [map, onKey, study, words]);
  return (
    <Dialog
      title={study.pressKey({ action: actionLabel(words, action) })}
      onClose={onClose}
      actions={<Button onClick={onClose}>{words.common.cancel}</Button>}
    >
      <p>{study.pressKeyText}</p>
      {refusal !== null && <Notice kind="hold">{refusal}</Notice>}
    </Dialog>
  );
}
