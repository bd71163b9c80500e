import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { expect, test } from 'vitest'
import { WheelFigure } from '@/components/wheel/wheel-figure'

test('T swaps the wheel for the angles of every cylinder', async () => {
  render(<WheelFigure csvName="wheel" rpm={2780} primaryDeg={26.5} backupDeg={null} staggerDeg={null} staggerMs={null} rotation="clockwise" cylindersAt={[{ label: '1', atDeg: 0 }, { label: '2', atDeg: 360 }]} />)
  screen.getByRole('button', { name: /numbers as a table/ }).focus()
  await userEvent.keyboard('t')
  expect(screen.queryByRole('img')).not.toBeInTheDocument()
  expect(screen.getByRole('row', { name: '1 0.0 −26.5 none' })).toBeVisible()
  expect(screen.getByRole('row', { name: '2 360.0 333.5 none' })).toBeVisible()
})
