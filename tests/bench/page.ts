/** Figures of the first page in a real browser: the weight of its scripts, and the time of a dragged frame. */
import { gzipSync } from 'node:zlib';
import { chromium, type Page } from '@playwright/test';
import type { Figure } from './figure';

const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** Squares that a knight is dragged over, there and back. */
const PATH = ['f3', 'e4', 'e5', 'd6', 'c5', 'c4', 'b5', 'b3', 'a4', 'd2', 'e3', 'f4', 'g5', 'h4', 'g3', 'f5'];

export async function pageFigures(url: string): Promise<Figure[]> {
  const browser = await chromium.launch({ executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium', args: FLAGS });
  try {
    const page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
    const weight = await scriptsWeight(page, url);
    const frames = await draggedFrames(page);
    const at = (share: number) => Number((frames[Math.floor(frames.length * share)] ?? Number.NaN).toFixed(1));
    const beside = `${frames.length} frames: reading with sentences, plate laid out, drawn and styled`;
    return [
      { name: 'first-page-scripts-gzip-kb', value: weight, unit: 'kB' },
      { name: 'drag-frame-ms-p50', value: at(0.5), unit: 'ms', beside },
      { name: 'drag-frame-ms-p95', value: at(0.95), unit: 'ms', beside },
    ];
  } finally {
    await browser.close();
  }
}

/** All scripts that the first page loads, each compressed; the polyfill that new browsers skip is not loaded, so not counted. */
async function scriptsWeight(page: Page, url: string): Promise<number> {
  const bodies: Promise<Buffer>[] = [];
  page.on('response', (response) => {
    if (response.request().resourceType() === 'script') bodies.push(response.body());
  });
  await page.goto(`${url}/`, { waitUntil: 'networkidle' });
  const sizes = (await Promise.all(bodies)).map((body) => gzipSync(body, { level: 9 }).length);
  if (sizes.length === 0) throw new Error('The first page loads no script.');
  return Number((sizes.reduce((sum, size) => sum + size, 0) / 1000).toFixed(1));
}

/** Milliseconds from a pointer's move to the page being drawn and styled anew, sorted. */
async function draggedFrames(page: Page): Promise<number[]> {
  const frames = await page.evaluate(async (path) => {
    const grid = document.querySelector<HTMLElement>('[role=grid]');
    const figure = grid?.parentElement?.querySelector('svg');
    if (!grid || !figure) throw new Error('no board');
    const box = grid.getBoundingClientRect();
    const send = (type: string, square: string) => {
      const clientX = box.left + ((square.charCodeAt(0) - 96.5) * box.width) / 8;
      const clientY = box.top + ((8.5 - Number(square.charAt(1))) * box.height) / 8;
      grid.dispatchEvent(
        new PointerEvent(type, { bubbles: true, clientX, clientY, pointerId: 1, button: 0, isPrimary: true }),
      );
    };
    grid.setPointerCapture = () => undefined;
    const times: number[] = [];
    send('pointerdown', 'f3');
    for (let round = 0; round < 20; round++) {
      for (const square of path.slice(1)) {
        await new Promise((resolve) => requestAnimationFrame(resolve));
        const changed = new Promise((resolve) => {
          const observer = new MutationObserver(() => {
            observer.disconnect();
            resolve(undefined);
          });
          observer.observe(figure, { subtree: true, childList: true, attributes: true, characterData: true });
        });
        const begun = performance.now();
        send('pointermove', square);
        await changed;
        figure.getBoundingClientRect();
        times.push(performance.now() - begun);
      }
    }
    send('pointerup', 'f3');
    return times;
  }, PATH);
  if (frames.length < 200) throw new Error('The drag moved nothing.');
  return frames.slice(15).sort((a, b) => a - b);
}
