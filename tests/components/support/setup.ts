import '@testing-library/jest-dom/vitest'
import { cleanup } from '@testing-library/react'
import { afterEach } from 'vitest'

// Automatic only with global test functions, which are not used here.
afterEach(cleanup)

/** Drawings measure themselves; without a layout nothing ever changes its width. */
class SilentObserver implements ResizeObserver {
  observe() {}
  unobserve() {}
  disconnect() {}
}
globalThis.ResizeObserver ??= SilentObserver
