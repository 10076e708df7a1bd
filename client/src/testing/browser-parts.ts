// What pages use of a browser and jsdom does not have.

/** Nothing is ever laid out here, so nothing ever changes its size. */
class StillResizeObserver implements ResizeObserver {
  observe(): void {
    return;
  }
  unobserve(): void {
    return;
  }
  disconnect(): void {
    return;
  }
}

Object.assign(globalThis, { ResizeObserver: StillResizeObserver });
