export { launch } from '../../src/commands/launch-chromium.ts';
