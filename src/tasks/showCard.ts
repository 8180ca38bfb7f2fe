import { writePairingCard } from '../exchange/pairingCard.ts';
import { type QrMatrix, qrMatrix } from '../exchange/qrMatrix.ts';
import { ok, type Result } from '../kernel/result.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import type { Deps } from './ports.ts';
import { freezeVersions } from './usedVersions.ts';

export type { QrMatrix } from '../exchange/qrMatrix.ts';

/** What the first tablet shows. */
export interface ShownCard {
  /** The QR codes to be shown in turn. */
  readonly pictures: readonly QrMatrix[];
  /** All of them as one text. */
  readonly text: string;
}

/** The pairing card of a visit: the frozen schedule for a second tablet, nobody's marks. Not part of `index.ts`: it is loaded when it is wanted. */
export async function showCard(deps: Deps, plan: VisitPlan): Promise<Result<ShownCard>> {
  const written = await writePairingCard(plan);
  if (!written.ok) return written;
  const frozen = await freezeVersions(deps, [plan.schedule.protocol]);
  if (!frozen.ok) return frozen;
  return ok({ pictures: written.value.parts.map(qrMatrix), text: written.value.text });
}
