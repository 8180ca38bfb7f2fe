import { decodeText } from '../exchange/decodeText.ts';
import { readClassList } from '../exchange/readClassList.ts';
import type { ListedChild } from '../exchange/types.ts';
import { newId } from '../kernel/ids.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import type { Child, Classroom } from '../model/classroom.ts';
import { checkedChild } from './children.ts';
import { editClassroom } from './edits.ts';
import { placeOnSeats, type SeatLeftOpen } from './listedSeats.ts';
import type { Deps } from './ports.ts';
import { sameName } from './text.ts';

export interface ClassListSource {
  /** What the list is called, where it came as a file; it is not kept. */
  readonly name?: string;
  /** Typed or pasted text, or the bytes of a CSV file. */
  readonly content: string | Uint8Array;
  /** For lists that do not speak of consent: whoever gives them says that every child on them has it. */
  readonly consent?: boolean;
}

export interface ClassListDone {
  readonly classroom: Classroom;
  readonly added: number;
  readonly changed: number;
  /** Children without consent: counted, never written down. */
  readonly withoutConsent: number;
  /** Seats of the list that nobody was put on, line by line. */
  readonly seatsLeftOpen: readonly SeatLeftOpen[];
}

/** Adds the children of a list to a class; a pseudonym that is there already keeps its child. */
export async function importClassList(
  deps: Deps,
  classroom: string,
  source: ClassListSource,
): Promise<Result<ClassListDone>> {
  const text = textOf(source.content);
  if (!text.ok) return text;
  const list = readClassList(text.value);
  if (!list.ok) return list;
  const { children: listed, leftOut, consentStated } = list.value;
  if (!consentStated && source.consent !== true) return problem('task.consentNotStated');
  let [added, changed] = [0, 0];
  let seatsLeftOpen: readonly SeatLeftOpen[] = [];
  const edited = await editClassroom(deps, classroom, (before) => {
    let state: Classroom = before;
    const ids = new Map<ListedChild, string>();
    for (const one of listed) {
      const standing = state.children.find(
        (child) => !child.removed && sameName(child.pseudonym, one.pseudonym),
      );
      const stratum = one.stratum ?? standing?.stratum ?? null;
      const checked = checkedChild(state, { pseudonym: one.pseudonym, stratum }, standing?.id ?? null);
      if (!checked.ok) return checked;
      const child: Child = standing ?? { id: newId(deps.random), ...checked.value, removed: false };
      ids.set(one, child.id);
      if (standing === undefined) added += 1;
      else if (standing.stratum !== checked.value.stratum) changed += 1;
      const next: Child = { ...child, stratum: checked.value.stratum };
      state = {
        ...state,
        children:
          standing === undefined
            ? [...state.children, next]
            : state.children.map((other) => (other.id === next.id ? next : other)),
      };
    }
    const wishes = listed.flatMap((one) => {
      const child = ids.get(one);
      return one.seat === null || child === undefined ? [] : [{ child, seat: one.seat, line: one.line }];
    });
    const seated = placeOnSeats(state.plan, wishes, deps.random);
    seatsLeftOpen = seated.leftOpen;
    return ok({ children: state.children, plan: seated.plan });
  });
  if (!edited.ok) return edited;
  return ok({ classroom: edited.value, added, changed, withoutConsent: leftOut, seatsLeftOpen });
}

function textOf(content: string | Uint8Array): Result<string> {
  if (typeof content === 'string') return ok(content);
  const decoded = decodeText(content);
  return decoded.ok ? ok(decoded.text) : { ok: false, problem: decoded.fault };
}
