import type { FileToHandOver, SharePort } from '../recorder/ports.ts';

/** The download is read by the browser after the click; a minute is plenty for the slowest tablet. */
const keepLinkMs = 60_000;

export const share: SharePort = {
  handOver: async ({ name, type, bytes }: FileToHandOver) => {
    const file = new File([bytes], name, { type });
    // Asked with the real file: which types are taken differs from system to system.
    if (navigator.canShare?.({ files: [file] })) {
      try {
        await navigator.share({ files: [file], title: name });
        return 'shared';
      } catch (error) {
        const why = error instanceof DOMException ? error.name : '';
        if (why === 'AbortError') return 'cancelled';
        if (why === 'NotAllowedError' && !navigator.userActivation?.isActive) return 'again';
      }
    }
    save(file);
    return 'saved';
  },
};

function save(file: File): void {
  const link = document.createElement('a');
  const url = URL.createObjectURL(file);
  link.href = url;
  link.download = file.name;
  document.body.append(link);
  link.click();
  link.remove();
  setTimeout(() => URL.revokeObjectURL(url), keepLinkMs);
}
