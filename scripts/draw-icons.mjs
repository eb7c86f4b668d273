// npm run icons: draws public/icon.svg and its PNGs anew. Needs Chromium; run by hand, and commit
// what changed. The glyph is a cutting mat with a phone beside it, on walnut.
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import { chromium } from 'playwright-core';

import { bringChromium } from './setup/chromium.mjs';
import { main } from './setup/main.mjs';
import { ROOT } from './setup/paths.mjs';

const WALNUT = '#4B3222';
const PAPER = '#F5EDDF';
const WELD = '#E2B23B';
// what a launcher may cut off a maskable icon lies outside a circle of 80 % of its width
const ICONS = [
  { file: 'icon.svg', glyphShare: 0.68, cornerShare: 0.22 },
  { file: 'icon-192.png', sizePx: 192, glyphShare: 0.68, cornerShare: 0.22 },
  { file: 'icon-512.png', sizePx: 512, glyphShare: 0.68, cornerShare: 0.22 },
  { file: 'icon-maskable-512.png', sizePx: 512, glyphShare: 0.52, cornerShare: 0 },
  { file: 'apple-touch-icon.png', sizePx: 180, glyphShare: 0.62, cornerShare: 0 },
];

/** On a grid of 24, the glyph in the middle at `glyphShare` of the width. */
function drawing({ glyphShare, cornerShare }) {
  const shift = (24 - 24 * glyphShare) / 2;
  return `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 24 24">
<rect width="24" height="24" rx="${24 * cornerShare}" fill="${WALNUT}"/>
<g transform="translate(${shift} ${shift}) scale(${glyphShare})" fill="none" stroke="${PAPER}" stroke-width="2" stroke-linecap="round" stroke-linejoin="round">
<rect x="2.5" y="3.5" width="12" height="17" rx="2"/>
<path d="M6.5 3.5v17M10.5 3.5v17M2.5 9.2h12M2.5 14.8h12" stroke-width="1" opacity=".75"/>
<rect x="17.5" y="8" width="4.5" height="9" rx="1.2" fill="${WELD}" stroke="${WELD}"/>
</g>
</svg>
`;
}

async function drawIcons() {
  const profile = mkdtempSync(path.join(tmpdir(), 'icons-'));
  const executablePath = await bringChromium();
  const context = await chromium.launchPersistentContext(profile, {
    executablePath,
    args: ['--no-sandbox', '--disable-gpu'],
  });
  try {
    const page = await context.newPage();
    for (const icon of ICONS) await draw(page, icon);
  } finally {
    await context.close();
    rmSync(profile, { recursive: true, force: true });
  }
  return 0;
}

async function draw(page, icon) {
  const file = path.join(ROOT, 'public', icon.file);
  const svg = drawing(icon);
  if (!icon.sizePx) return writeFileSync(file, svg);
  const size = { width: icon.sizePx, height: icon.sizePx };
  await page.setViewportSize(size);
  await page.setContent(`<style>body{margin:0}svg{display:block;width:100vw}</style>${svg}`);
  await page.screenshot({ path: file, omitBackground: true });
}

await main(drawIcons, () => 130);
