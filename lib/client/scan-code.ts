import { prepareZXingModule, readBarcodes } from 'zxing-wasm/reader';

/** The part of the Barcode Detection API that we use; TypeScript's own library does not know it. */
type Detector = { detect(source: ImageBitmapSource): Promise<{ rawValue: string }[]> };
type DetectorClass = {
  new (options: { formats: string[] }): Detector;
  getSupportedFormats(): Promise<string[]>;
};

export type CodeReader = (frame: ImageData) => Promise<string | null>;

// The decoder comes from our own origin; without this the library would fetch it from a content network.
const wasm = new URL('../../node_modules/zxing-wasm/dist/reader/zxing_reader.wasm', import.meta.url).href;

/** The browser's own reader where it knows QR codes, else ZXing compiled to WebAssembly. Reads one code a frame. */
export async function openCodeReader(): Promise<CodeReader> {
  const native = (globalThis as { BarcodeDetector?: DetectorClass }).BarcodeDetector;
  if (native && (await native.getSupportedFormats().catch((): string[] => [])).includes('qr_code')) {
    const detector = new native({ formats: ['qr_code'] });
    return async (frame) => (await detector.detect(frame))[0]?.rawValue ?? null;
  }
  await prepareZXingModule({
    overrides: {
      locateFile: (path: string, prefix: string) => (path.endsWith('.wasm') ? wasm : prefix + path),
    },
    fireImmediately: true,
  });
  return async (frame) => {
    const found = await readBarcodes(frame, { formats: ['QRCode'], maxNumberOfSymbols: 1, tryHarder: true });
    return found.find((code) => code.isValid)?.text ?? null;
  };
}
