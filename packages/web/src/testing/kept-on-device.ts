/** Stands in for the device's own store, which jsdom has none of; a test starts with an empty one. */
export const keptOnDevice = new Map<string, unknown>();

export const get = (key: string): Promise<unknown> => Promise.resolve(keptOnDevice.get(key));
export const set = (key: string, value: unknown): Promise<void> =>
  Promise.resolve(void keptOnDevice.set(key, value));
export const del = (key: string): Promise<void> => Promise.resolve(void keptOnDevice.delete(key));
