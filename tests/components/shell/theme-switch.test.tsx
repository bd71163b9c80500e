import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { expect, test, vi } from 'vitest'
import { readTheme } from '@/components/shell/theme'
import { ThemeSwitch } from '@/components/shell/theme-switch'

test('turns the page at once, keeps the choice in a cookie and sends nothing', async () => {
  const setTheme = vi.fn(async () => {})
  render(<ThemeSwitch theme="system" setTheme={setTheme} />)
  await userEvent.click(screen.getByRole('button', { name: 'Dark' }))
  expect(document.documentElement).toHaveAttribute('data-theme', 'dark')
  expect(document.cookie).toContain('theme=dark')
  expect(screen.getByRole('button', { name: 'Dark' })).toHaveAttribute('aria-pressed', 'true')
  await userEvent.click(screen.getByRole('button', { name: 'System' }))
  expect(document.documentElement).not.toHaveAttribute('data-theme')
  expect(setTheme).not.toHaveBeenCalled()
})

test('an unknown cookie counts as no choice', () => {
  expect([undefined, 'sepia', 'dark', 'light'].map(readTheme)).toEqual(['system', 'system', 'dark', 'light'])
})
