import { describe, expect, test } from 'vitest'
import { placeLabels, type Box } from '@/components/wheel/labels'
import { sizeFor, wheelView } from '@/components/wheel/sizes'

const text = (deg: number) => `${deg.toFixed(1)}°`
const pairs = [[26.5, 17], [20, 20], [17, 24], [4, -5], [60, 30], [0, 0], [10, 9.6], [-3, -12], [45, 44]] as const
const cases = pairs.flatMap(([a, b]) => (['clockwise', 'anticlockwise'] as const).flatMap((rotation) => ([['full', 366], ['crop', 328], ['mini', 238]] as const).map(([size, width]) => ({ a, b, rotation, size, width }))))

const overlaps = (one: Box, other: Box) => one.left < other.right && other.left < one.right && one.top < other.bottom && other.top < one.bottom

describe('labels of the wheel', () => {
  test.each(cases)('A $a° and B $b°, $rotation, $size: both numbers in sight, apart from each other and from the other letter', ({ a, b, rotation, size, width }) => {
    const view = wheelView(size, width)
    const labels = placeLabels({ rotation, primary: { deg: a, text: text(a) }, backup: { deg: b, text: text(b) }, view })
    if (!labels.a || !labels.b) throw new Error('both sparks are drawn')
    for (const { box } of [labels.a, labels.b]) {
      expect(box.left).toBeGreaterThanOrEqual(view.left)
      expect(box.right).toBeLessThanOrEqual(view.left + view.width)
      expect(box.top).toBeGreaterThanOrEqual(view.top)
    }
    expect(overlaps(labels.a.box, labels.b.box)).toBe(false)
    const letter = ({ chip }: { chip: { x: number, y: number } }): Box => ({ left: chip.x - view.chip, right: chip.x + view.chip, top: chip.y - view.chip, bottom: chip.y + view.chip })
    expect(overlaps(labels.a.box, letter(labels.b))).toBe(false)
    expect(overlaps(labels.b.box, letter(labels.a))).toBe(false)
    const font = size === 'mini' ? view.font.small : view.font.medium
    const tdc: Box = { left: labels.tdc.x - font, right: labels.tdc.x + font, top: labels.tdc.y - font * 0.68, bottom: labels.tdc.y }
    expect(overlaps(tdc, labels.a.box) || overlaps(tdc, labels.b.box)).toBe(false)
  })

  test('a ring number gives way to a spark that stands on it and stays on the other side', () => {
    const { numbers } = placeLabels({ rotation: 'clockwise', primary: { deg: 30, text: '30.0°' }, backup: { deg: 10, text: '10.0°' }, view: wheelView('full', 366) })
    expect(numbers.filter((number) => number.text === '30')).toHaveLength(1)
    expect(numbers.filter((number) => number.text === '90')).toHaveLength(2)
  })

  test('the narrower the drawing the fewer the words, and no type below 13 px', () => {
    expect([520, 340, 339, 300, 299, 180].map((width) => sizeFor(width))).toEqual(['full', 'full', 'crop', 'crop', 'mini', 'mini'])
    expect([520, 358, 299].map((width) => sizeFor(width, true))).toEqual(['crop', 'crop', 'mini'])
    for (const width of [180, 238, 299, 300, 328, 340, 366, 520]) {
      const view = wheelView(sizeFor(width), width)
      expect((view.font.small * width) / view.width).toBeGreaterThanOrEqual(12.9)
    }
  })
})
