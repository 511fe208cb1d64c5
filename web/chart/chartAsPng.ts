import type { Inks } from './readInks.ts';
import { wrapped } from './barChart.ts';

/** The chart's canvas on paper with its sentence above it, as a PNG. */
export async function chartAsPng(canvas: HTMLCanvasElement, sentence: string, inks: Inks): Promise<Blob> {
  const scale = canvas.width / canvas.clientWidth;
  const line = 20;
  const letters = Math.max(20, Math.floor((canvas.clientWidth - 2 * MARGIN) / 7.2));
  const lines = wrapped(sentence, letters);
  const head = MARGIN + lines.length * line + 8;
  const sheet = document.createElement('canvas');
  sheet.width = Math.round((canvas.clientWidth + 2 * MARGIN) * scale);
  sheet.height = Math.round((canvas.clientHeight + head + MARGIN) * scale);
  const pen = sheet.getContext('2d');
  if (!pen) throw new Error('chartAsPng: the browser gave no canvas to draw on');
  pen.scale(scale, scale);
  pen.fillStyle = inks.paper;
  pen.fillRect(0, 0, sheet.width, sheet.height);
  pen.fillStyle = inks.of.plain;
  pen.font = `15px ${inks.font}`;
  lines.forEach((text, i) => pen.fillText(text, MARGIN, MARGIN + 14 + i * line));
  pen.drawImage(canvas, MARGIN, head, canvas.clientWidth, canvas.clientHeight);
  return new Promise((resolve, reject) => {
    sheet.toBlob(
      (blob) => (blob ? resolve(blob) : reject(new Error('chartAsPng: the browser made no picture'))),
      'image/png',
    );
  });
}

const MARGIN = 16;
