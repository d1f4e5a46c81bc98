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
