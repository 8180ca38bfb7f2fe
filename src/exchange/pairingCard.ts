import * as z from 'zod/mini';
import { canonicalJson } from '../kernel/canonicalJson.ts';
import { ok, type Result } from '../kernel/result.ts';
import { type VisitPlan, visitPlan } from '../model/visitPlan.ts';
import { toBase32 } from './base32.ts';
import { type CardParts, missingParts, mostParts, splitContent, writePart, writeText } from './cardParts.ts';
import { cardProblem } from './cardProblems.ts';
import { currentVersion } from './envelope.ts';
import { migrate } from './migrations.ts';
import { packTree, unpackTree } from './packTree.ts';
import { schemaFault } from './schemaFault.ts';

/** A visit as pictures and as text. */
export interface PairingCard {
  readonly card: string;
  /** The text of each picture, in their order. */
  readonly parts: readonly string[];
  /** All in one, to copy, paste or type, in lines that check themselves. */
  readonly text: string;
}

const cardBytes = 5;
const checkBytes = 8;

/**
 * A visit for a second tablet, in texts that a QR code holds. The same visit gives the same card. Fails when it would
 * take more pictures than anybody wants to hold a tablet before (`card.tooLarge`).
 */
export async function writePairingCard(plan: VisitPlan): Promise<Result<PairingCard>> {
  // As a visit file says it: the version first, so that an older content can be brought forward.
  const content = [currentVersion, plan];
  const digest = await digestOf(content);
  const card = toBase32(digest.slice(0, cardBytes));
  const packed = packTree(content);
  const bytes = new Uint8Array(checkBytes + packed.length);
  bytes.set(digest.slice(cardBytes, cardBytes + checkBytes));
  bytes.set(packed, checkBytes);
  const pieces = splitContent(bytes);
  if (pieces.length > mostParts)
    return cardProblem('card.tooLarge', { pictures: pieces.length, most: mostParts });
  return ok({
    card,
    parts: pieces.map((piece, i) => writePart(card, i + 1, pieces.length, piece)),
    text: writeText(card, bytes),
  });
}

const stated = z.tuple([z.int().check(z.minimum(1)), z.unknown()]);

/** The visit of a card whose parts have all been read: the same, byte for byte in canonical JSON, or a problem. */
export async function readPairingCard(read: CardParts): Promise<Result<VisitPlan>> {
  const missing = missingParts(read);
  if (missing.length > 0) return cardProblem('card.missing', { missing: missing.join(', '), of: read.of });
  const pieces = Array.from({ length: read.of }, (_, i) => [...(read.parts.get(i + 1) ?? [])]);
  const bytes = Uint8Array.from(pieces.flat());
  const unpacked = unpackTree(bytes.subarray(checkBytes));
  if (unpacked === null) return cardProblem('card.damaged', {});
  const digest = await digestOf(unpacked.value);
  const intact =
    toBase32(digest.slice(0, cardBytes)) === read.card &&
    bytes.subarray(0, checkBytes).every((byte, i) => byte === digest[cardBytes + i]);
  const content = stated.safeParse(unpacked.value);
  if (!intact || !content.success) return cardProblem('card.damaged', {});
  const [version, visit] = content.data;
  if (version > currentVersion) return cardProblem('card.newer', { version, known: currentVersion });
  const envelope = migrate({ version, visit }, version, currentVersion);
  const issue = z.safeParse(z.object({ visit: visitPlan }), envelope).error?.issues[0];
  if (issue !== undefined) return { ok: false, problem: schemaFault(envelope, issue).fault };
  // As it was read, not as the schema knows it: what a newer program adds is kept and passed on.
  return ok((envelope as unknown as { visit: VisitPlan }).visit);
}

/** SHA-256 (FIPS 180-4) of the canonical JSON. */
async function digestOf(value: unknown): Promise<Uint8Array> {
  const bytes = new TextEncoder().encode(canonicalJson(value));
  return new Uint8Array(await crypto.subtle.digest('SHA-256', bytes));
}
