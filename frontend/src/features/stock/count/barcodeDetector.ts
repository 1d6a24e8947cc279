/** What browsers that read codes by themselves offer; not in the type library yet. */
export interface CodeReader {
  detect(source: HTMLVideoElement): Promise<{ rawValue: string }[]>;
}
type CodeReaderClass = new () => CodeReader;

function readerClass(): CodeReaderClass | null {
  const offered: unknown = (globalThis as { BarcodeDetector?: unknown }).BarcodeDetector;
  return typeof offered === 'function' ? (offered as CodeReaderClass) : null;
}

/** Whether this browser can read codes through the camera; without it there is no button. */
export function hasCameraScan(): boolean {
  // Browsers give the camera to secure pages only, and then there is no `mediaDevices` at all.
  const devices = navigator.mediaDevices as MediaDevices | undefined;
  return readerClass() !== null && typeof devices?.getUserMedia === 'function';
}

export function newCodeReader(): CodeReader | null {
  const Reader = readerClass();
  return Reader === null ? null : new Reader();
}
