// The core alone: the package's entry brings along drawers for canvas, PNG and the terminal.
import { create } from 'qrcode/lib/core/qrcode.js';

/** A QR code as squares. */
export interface QrMatrix {
  /** Modules a side, without the quiet zone of four that belongs around it. */
  readonly size: number;
  /** Row by row, true = dark. */
  readonly dark: readonly boolean[];
}

/** The QR code (ISO/IEC 18004) of a text in capitals, correction level M: 15 % of it may be unreadable. */
export function qrMatrix(text: string): QrMatrix {
  const { modules } = create([{ data: text, mode: 'alphanumeric' }], { errorCorrectionLevel: 'M' });
  return { size: modules.size, dark: Array.from(modules.data, (module) => module === 1) };
}
