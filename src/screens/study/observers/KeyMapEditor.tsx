import { useState } from 'react';
import { defaultKeyMap } from '../../../model/keyMap.ts';
import type { KeyAction, KeyMap, Observer } from '../../../model/observer.ts';
import { saveObserver } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { Check } from '../../../ui/Choice.tsx';
import { HeldButton } from '../../../ui/HeldButton.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';
import { actionLabel, keyActions } from './keyActions.ts';
import { PressKey } from './PressKey.tsx';
import './keys.css';

/** What each key does in the room for one observer; any of it can be changed, and all of it switched off. */
export function KeyMapEditor({ observer }: { readonly observer: Observer }) {
  const { words, deps } = useServices();
  const { study } = words;
  const { run, tell, notice } = useDoing();
  const [asking, setAsking] = useState<KeyAction | null>(null);
  const map = observer.keyMap ?? defaultKeyMap();
  const put = async (keyMap: KeyMap | null) => {
    const standing = observer.keyMap;
    const kept = await run(saveObserver(deps, observer.id, { keyMap }));
    if (kept.ok) tell(study.keysChanged, () => saveObserver(deps, observer.id, { keyMap: standing }));
  };
  const without = (key: string) =>
    Object.fromEntries(Object.entries(map.keys).filter(([name]) => name !== key));
  return (
    <section className="keys stack-tight" aria-label={study.keysOf({ name: observer.name })}>
      <p className="second">{study.keysNote}</p>
      <Check label={study.keysOn} checked={map.on} onChange={(on) => put({ ...map, on })} />
      {notice}
      <ul>
        {keyActions.map((action) => {
          const label = actionLabel(words, action);
          const keys = Object.keys(map.keys).filter((key) => map.keys[key] === action);
          return (
            <li key={action} className="keys-line">
              <span>{label}</span>
              <span className="row">
                {keys.length === 0 && <span className="second">{study.noKey}</span>}
                {keys.map((key) => (
                  <Button
                    key={key}
                    className="key"
                    aria-label={study.takeKeyAway({ key: study.keyLabel({ key }), action: label })}
                    onClick={() => put({ ...map, keys: without(key) })}
                  >
                    <kbd>{study.keyLabel({ key })}</kbd>
                    <svg width="12" height="12" viewBox="0 0 12 12" aria-hidden="true">
                      <path d="M1 1 L11 11 M11 1 L1 11" />
                    </svg>
                  </Button>
                ))}
                <Button
                  look="quiet"
                  aria-label={study.addKeyFor({ action: label })}
                  onClick={() => setAsking(action)}
                >
                  {study.addKey}
                </Button>
              </span>
            </li>
          );
        })}
      </ul>
      <div className="row">
        <HeldButton why={observer.keyMap === null ? study.usualKeysNow : null} onClick={() => put(null)}>
          {study.usualKeys}
        </HeldButton>
      </div>
      {asking !== null && (
        <PressKey
          action={asking}
          map={map}
          onKey={(key) => {
            setAsking(null);
            void put({ ...map, keys: { ...map.keys, [key]: asking } });
          }}
          onClose={() => setAsking(null)}
        />
      )}
    </section>
  );
}
