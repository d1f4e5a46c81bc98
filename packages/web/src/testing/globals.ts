// What jsdom does not lay out or scroll, so that components may ask for it.
class NothingToMeasure {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}

function noMatch(media: string): MediaQueryList {
  return {
    matches: false,
    media,
    onchange: null,
    addListener: () => undefined,
    removeListener: () => undefined,
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
    dispatchEvent: () => false,
  };
}

Object.assign(window, {
  matchMedia: noMatch,
  ResizeObserver: NothingToMeasure,
  IntersectionObserver: NothingToMeasure,
  scrollTo: () => undefined,
});
Element.prototype.scrollIntoView = () => undefined;

// jsdom's files cannot be read as a stream, and without that an upload to msw never arrives.
function bytesOf(file: Blob): Promise<ArrayBuffer> {
  return new Promise((resolve, reject) => {
    const reader = new FileReader();
    reader.onload = () => resolve(reader.result as ArrayBuffer);
    reader.onerror = () => reject(reader.error);
    reader.readAsArrayBuffer(file);
  });
}

Object.assign(Blob.prototype, {
  arrayBuffer(this: Blob) {
    return bytesOf(this);
  },
  async text(this: Blob) {
    return new TextDecoder().decode(await bytesOf(this));
  },
  stream(this: Blob) {
    return new ReadableStream({
      start: async (controller) => {
        controller.enqueue(new Uint8Array(await bytesOf(this)));
        controller.close();
      },
    });
  },
});
