'use client'

import { useState, type MouseEvent } from 'react'
import { themeCookie, themeMaxAge, themes, type Theme } from './theme'

interface ThemeSwitchProps {
  theme: Theme
  /** Sets the cookie on the server: the way without a script. */
  setTheme: (formData: FormData) => Promise<void>
}

const words: Record<Theme, string> = { system: 'System', light: 'Light', dark: 'Dark' }

function turnTo(theme: Theme) {
  document.cookie = `${themeCookie}=${theme}; path=/; max-age=${themeMaxAge}; samesite=lax`
  if (theme === 'system') document.documentElement.removeAttribute('data-theme')
  else document.documentElement.setAttribute('data-theme', theme)
}

/** Three buttons of one form. With a script the page turns at once and nothing is sent. */
export function ThemeSwitch({ theme, setTheme }: ThemeSwitchProps) {
  const [chosen, setChosen] = useState(theme)
  const choose = (event: MouseEvent, next: Theme) => {
    event.preventDefault()
    turnTo(next)
    setChosen(next)
  }
  return (
    <form action={setTheme}>
      <span className="pick" role="group" aria-label="Theme">
        {themes.map((name) => (
          <button key={name} type="submit" name="theme" value={name} aria-pressed={name === chosen} onClick={(event) => choose(event, name)}>{words[name]}</button>
        ))}
      </span>
    </form>
  )
}
