import { onTestFinished, vi } from 'vitest'

/** Gives every element a width, for this test: without a layout all are 0 wide. */
export function giveWidth(width: number): void {
  const spy = vi.spyOn(HTMLElement.prototype, 'clientWidth', 'get').mockReturnValue(width)
  onTestFinished(() => spy.mockRestore())
}
