// Writes the PNG icons of public/icons from dawnpeg.svg with Debian's Chromium.
// Run by hand when the drawing changes:  node docker-free-scripts/make-app-icons.mjs
import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { chromium } from '@playwright/test';

const SIZES_PX = [48, 180, 192, 512];

const folder = fileURLToPath(new URL('../public/icons/', import.meta.url));
const svg = readFileSync(`${folder}dawnpeg.svg`, 'utf8');
const browser = await chromium.launch({
  executablePath: '/usr/bin/chromium-headless-shell',
  args: ['--no-sandbox'],
});
try {
  for (const size of SIZES_PX) {
    const page = await browser.newPage({ viewport: { width: size, height: size } });
    await page.setContent(`<style>body{margin:0}svg{display:block;width:100vw;height:100vh}</style>${svg}`);
    await page.screenshot({ path: `${folder}dawnpeg-${size}.png` });
    await page.close();
  }
} finally {
  await browser.close();
}
