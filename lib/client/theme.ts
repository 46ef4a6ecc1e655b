export type Theme = 'light' | 'dark';

const key = 'smirr-theme';

/** Runs in the head before the first paint, so that a chosen theme never flashes the other one. No cookie is set. */
export const themeScript = `try{var t=localStorage.getItem('${key}');if(t==='light'||t==='dark')document.documentElement.dataset.theme=t}catch(e){}`;

export function currentTheme(): Theme {
  const chosen = document.documentElement.dataset.theme;
  if (chosen === 'light' || chosen === 'dark') return chosen;
  return window.matchMedia('(prefers-color-scheme: dark)').matches ? 'dark' : 'light';
}

/** Shows a theme and remembers it. Storage may be refused (private windows): the theme then lasts for the page. */
export function chooseTheme(theme: Theme): void {
  document.documentElement.dataset.theme = theme;
  try {
    localStorage.setItem(key, theme);
  } catch {}
}
