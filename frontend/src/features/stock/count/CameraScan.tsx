import Alert from '@mui/material/Alert';
import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import { useEffect, useEffectEvent, useRef, useState } from 'react';
import { newCodeReader } from './barcodeDetector';

/** The picture is looked at this often, ms. */
const LOOK = 200;

/** Reads a code through the camera; the camera is on only while this stands open. */
export function CameraScan({ onRead, onClose }: { onRead: (text: string) => void; onClose: () => void }) {
  const video = useRef<HTMLVideoElement>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  const read = useEffectEvent(onRead);

  useEffect(() => {
    let stream: MediaStream | null = null;
    let timer: ReturnType<typeof setInterval> | undefined;
    let ended = false;
    const reader = newCodeReader();
    const look = async () => {
      const picture = video.current;
      if (!reader || !picture || picture.readyState < picture.HAVE_CURRENT_DATA) return;
      const [code] = await reader.detect(picture).catch(() => []);
      if (code && !ended) {
        ended = true;
        read(code.rawValue);
      }
    };
    const start = async () => {
      try {
        stream = await navigator.mediaDevices.getUserMedia({ video: { facingMode: 'environment' } });
        if (ended || !video.current) {
          stop();
          return;
        }
        video.current.srcObject = stream;
        await video.current.play();
        timer = setInterval(() => void look(), LOOK);
      } catch {
        if (!ended) setRefusal('The browser gives no camera to this page. Allow it, or type the number.');
      }
    };
    const stop = () => {
      ended = true;
      clearInterval(timer);
      stream?.getTracks().forEach((track) => track.stop());
    };
    void start();
    return stop;
  }, []);

  return (
    <Dialog open fullWidth maxWidth="xs" onClose={onClose} aria-labelledby="camera-title">
      <DialogTitle id="camera-title">Hold the code in front of the camera</DialogTitle>
      <DialogContent>
        {refusal !== null && <Alert severity="error">{refusal}</Alert>}
        <video ref={video} muted playsInline style={{ width: '100%', display: refusal ? 'none' : 'block' }} />
      </DialogContent>
      <DialogActions>
        <Button onClick={onClose}>Cancel</Button>
      </DialogActions>
    </Dialog>
  );
}
