import base from './playwright.config';

/** Screenshots of every page and state: `npm run shots`, or against what runs: `BASE_URL=… npx playwright test -c playwright.shots.config.ts`. */
const config = {
  ...base,
  testDir: 'tests/shots',
  timeout: 600_000,
  fullyParallel: true,
  projects: [
    { name: 'phone', use: { viewport: { width: 390, height: 844 }, deviceScaleFactor: 2, hasTouch: true } },
    { name: 'tablet', use: { viewport: { width: 820, height: 1180 } } },
    { name: 'desktop', use: { viewport: { width: 1440, height: 900 } } },
    // 200 % zoom on the desktop: half the space in CSS pixels, twice the pixels a CSS pixel.
    { name: 'zoom', use: { viewport: { width: 720, height: 450 }, deviceScaleFactor: 2 } },
  ],
};

export default config;
