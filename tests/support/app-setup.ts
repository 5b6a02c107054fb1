import { setupZonelessTestEnv } from 'jest-preset-angular/setup-env/zoneless';

setupZonelessTestEnv({ errorOnUnknownElements: true, errorOnUnknownProperties: true });

// jsdom has no canvas: Chart.js then logs and skips drawing; real drawing is tested in Chromium.
Object.defineProperty(HTMLCanvasElement.prototype, 'getContext', { value: () => null });
