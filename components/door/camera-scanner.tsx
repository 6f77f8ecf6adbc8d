'use client';

import { useEffect, useRef, useState } from 'react';
import { openCodeReader } from '@/lib/client/scan-code';
import { Notice } from '../ui/notice';

// Wide enough for a small code on a dim screen, small enough to decode several times a second on an old phone.
const WIDTH = 720;

type CameraScannerProps = {
  /** Called with each text read. While `paused`, frames are not looked at and the camera stays on. */
  onCode: (text: string) => void;
  paused: boolean;
};

type CameraState = 'starting' | 'looking' | 'refused' | 'none';

/** The camera's picture, looked at frame by frame for a QR code. Pictures never leave the phone. */
export function CameraScanner({ onCode, paused }: CameraScannerProps) {
  const video = useRef<HTMLVideoElement>(null);
  const [state, setState] = useState<CameraState>('starting');
  // Refs, because the loop below outlives renders and must see today's values.
  const heard = useRef(onCode);
  const resting = useRef(paused);
  heard.current = onCode;
  resting.current = paused;

  useEffect(() => {
    let stopped = false;
    let stream: MediaStream | null = null;
    const stop = (): void => {
      for (const track of stream?.getTracks() ?? []) track.stop();
    };
    const canvas = document.createElement('canvas');
    const look = async (): Promise<void> => {
      try {
        stream = await navigator.mediaDevices.getUserMedia({
          video: { facingMode: 'environment', width: { ideal: 1280 } },
          audio: false,
        });
      } catch (error) {
        return setState(
          error instanceof DOMException && error.name === 'NotAllowedError' ? 'refused' : 'none',
        );
      }
      const read = await openCodeReader();
      const screen = video.current;
      if (stopped || !screen) return stop();
      screen.srcObject = stream;
      await screen.play().catch(() => undefined);
      setState('looking');
      const brush = canvas.getContext('2d', { willReadFrequently: true });
      while (!stopped && brush) {
        await new Promise((done) => requestAnimationFrame(done));
        if (resting.current || screen.videoWidth === 0) continue;
        canvas.width = Math.min(WIDTH, screen.videoWidth);
        canvas.height = Math.round((canvas.width * screen.videoHeight) / screen.videoWidth);
        brush.drawImage(screen, 0, 0, canvas.width, canvas.height);
        const text = await read(brush.getImageData(0, 0, canvas.width, canvas.height)).catch(() => null);
        if (text !== null && !stopped && !resting.current) heard.current(text);
      }
    };
    void look();
    return () => {
      stopped = true;
      stop();
    };
  }, []);

  if (state === 'refused')
    return (
      <Notice tone="stop" title="The camera is not allowed here">
        Allow it for this page in the browser's settings and load the page again, or find people by name
        below.
      </Notice>
    );
  if (state === 'none')
    return (
      <Notice tone="stop" title="No camera answers">
        Another program may hold it. Find people by name below.
      </Notice>
    );
  return (
    <div className="relative overflow-hidden rounded border-2 border-ink bg-ink">
      <video
        ref={video}
        playsInline
        muted
        className="aspect-square w-full object-cover"
        aria-label="Camera picture"
      />
      <p role="status" className="absolute inset-x-0 bottom-0 bg-ink/80 px-3 py-2 text-center text-board">
        {state === 'starting' ? 'Starting the camera…' : 'Hold the ticket in front of the camera'}
      </p>
    </div>
  );
}
