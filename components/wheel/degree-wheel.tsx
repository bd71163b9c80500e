'use client'

import { usePhone } from '@/components/ui/use-phone'
import { useWidth } from '@/components/ui/use-width'
import { sizeFor, type WheelSize } from './sizes'
import { WheelDrawing, type WheelDrawingProps } from './wheel-drawing'

export type DegreeWheelProps = Omit<WheelDrawingProps, 'size' | 'width'> & {
  /** auto: made for the width it finds, and again when that changes. */
  size?: WheelSize | 'auto'
  /** Widest, px. */
  width?: number
}

/** Width, px, at which a server draws it: the phone's and the desk's drawing, one of which the style hides. */
const servedFull = 366
const servedCrop = 328

export function DegreeWheel({ size = 'auto', width, ...rest }: DegreeWheelProps) {
  const [ref, found] = useWidth<HTMLDivElement>()
  const phone = usePhone()
  if (size !== 'auto') return <div className="wheel"><WheelDrawing {...rest} size={size} width={width ?? (size === 'full' ? servedFull : size === 'crop' ? servedCrop : 238)} /></div>
  const given = found === null ? null : Math.min(found, width ?? servedFull)
  return (
    <div className="wheel drawn" ref={ref}>
      {given === null ? (
        <>
          <div className="only-w"><WheelDrawing {...rest} size="full" width={width ?? servedFull} /></div>
          <div className="only-n"><WheelDrawing {...rest} size="crop" width={servedCrop} /></div>
        </>
      ) : <WheelDrawing {...rest} size={sizeFor(given, phone)} width={given} />}
    </div>
  )
}
