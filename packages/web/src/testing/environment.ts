import JsdomEnvironment from 'jest-environment-jsdom';

/**
 * jsdom has no fetch of its own, and msw answers Node's; the rest is what either builds on. Blob, File and FormData stay
 * jsdom's: its inputs and uploads make them.
 */
const OF_NODE = [
  'fetch',
  'Headers',
  'Request',
  'Response',
  'TextEncoder',
  'TextDecoder',
  'TextDecoderStream',
  'ReadableStream',
  'TransformStream',
  'WritableStream',
  'CompressionStream',
  'DecompressionStream',
  'BroadcastChannel',
  'structuredClone',
] as const;

// eslint-disable-next-line no-restricted-syntax -- Jest takes an environment by its default export.
export default class PageEnvironment extends JsdomEnvironment {
  override async setup(): Promise<void> {
    await super.setup();
    for (const name of OF_NODE)
      Object.defineProperty(this.global, name, {
        value: globalThis[name],
        writable: true,
        configurable: true,
      });
  }
}
