/** The part of `qrcode` that computes and draws nothing; the published types know only the entry. */
declare module 'qrcode/lib/core/qrcode.js' {
  export { create } from 'qrcode';
}
