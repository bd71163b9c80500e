'use client'

import { PlotPieces } from './plot-pieces'
import { Section } from '@/components/ui/section'
import { WheelFigure } from '@/components/wheel/wheel-figure'
import { DegreeWheel } from '@/components/wheel/degree-wheel'

const six = ['1', '6', '3', '2', '5', '4'].map((label, index) => ({ label, atDeg: index * 120 }))
const eight = ['1', '8', '4', '3', '6', '5', '7', '2'].map((label, index) => ({ label, atDeg: index * 90 }))
const four = ['1', '3', '4', '2'].map((label, index) => ({ label, atDeg: index * 180 }))

const wheels = [
  { title: 'Clockwise', primaryDeg: 26.5, backupDeg: 17, rotation: 'clockwise', cylindersAt: six },
  { title: 'Anticlockwise', primaryDeg: 26.5, backupDeg: 17, rotation: 'anticlockwise', cylindersAt: six },
  { title: 'Equal', primaryDeg: 20, backupDeg: 20, rotation: 'clockwise', cylindersAt: six },
  { title: 'B first', primaryDeg: 17, backupDeg: 24, rotation: 'clockwise', cylindersAt: six },
  { title: 'After TDC', primaryDeg: 4, backupDeg: -5, rotation: 'clockwise', cylindersAt: six },
  { title: 'Far', primaryDeg: 68, backupDeg: 30, rotation: 'clockwise', cylindersAt: six },
  { title: 'Eight', primaryDeg: 31, backupDeg: 22, rotation: 'anticlockwise', cylindersAt: eight },
  { title: 'Four', primaryDeg: 25, backupDeg: 25.4, rotation: 'clockwise', cylindersAt: four },
] as const

export function DrawingPieces() {
  return (
    <>
      <PlotPieces />
      <Section title="Wheels">
        <div className="flex flex-wrap gap-6 pt-3">
          {wheels.map(({ title, ...wheel }) => (
            <div key={title} style={{ width: 366, maxWidth: '100%' }}>
              <WheelFigure title={title} csvName="wheel" rpm={2780} {...wheel} staggerDeg={wheel.primaryDeg - wheel.backupDeg} staggerMs={(wheel.primaryDeg - wheel.backupDeg) / (0.006 * 2780)} />
            </div>
          ))}
        </div>
      </Section>
      <Section title="Narrow wheels">
        <div className="flex flex-wrap gap-6 pt-3">
          {wheels.map(({ title, ...wheel }) => (
            <div key={title}>
              <DegreeWheel size="crop" width={328} rpm={2780} {...wheel} staggerDeg={wheel.primaryDeg - wheel.backupDeg} staggerMs={(wheel.primaryDeg - wheel.backupDeg) / (0.006 * 2780)} />
              <DegreeWheel size="mini" width={238} rpm={2780} {...wheel} staggerDeg={wheel.primaryDeg - wheel.backupDeg} staggerMs={(wheel.primaryDeg - wheel.backupDeg) / (0.006 * 2780)} />
            </div>
          ))}
        </div>
      </Section>
    </>
  )
}
