import type { SharePort } from '../recorder/ports.ts';

/**
 * The system's share sheet where it takes the very file, else a download. Installed apps on iPads have no downloads
 * folder to speak of, and some systems refuse some types: so the file itself is asked about.
 */
export const share: SharePort = {
  handOver: async ({ name, type, bytes }) => {
    const file = new File([bytes], name, { type });
    if (navigator.canShare?.({ files: [file] }) === true) {
      try {
        await navigator.share({ files: [file] });
        return 'shared';
      } catch (error) {
        const kind = error instanceof DOMException ? error.name : '';
        if (kind === 'AbortError') return 'cancelled';
        if (kind === 'NotAllowedError') return 'again';
        // Anything else: this system cannot share it after all.
      }
    }
    const address = URL.createObjectURL(file);
    const link = document.createElement('a');
    link.href = address;
    link.download = name;
    link.click();
    // Not at once: Safari reads the address after the click has been dealt with.
    setTimeout(() => URL.revokeObjectURL(address), 60_000);
    return 'saved';
  },
};
