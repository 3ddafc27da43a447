/** What the person chose: a fixed theme, or whatever the device asks for. */
export const themes = ['device', 'light', 'dark'] as const;
export type Theme = (typeof themes)[number];

export const THEME_COOKIE = 'theme';

/** The theme a cookie stands for; anything unknown means the device decides. */
export function themeFrom(cookie: string | undefined): Theme {
  return themes.find((theme) => theme === cookie) ?? 'device';
}

const ONE_YEAR_S = 60 * 60 * 24 * 365;

/** In the browser: shows the theme at once, and keeps it in the cookie that the root layout reads. */
export function applyTheme(theme: Theme): void {
  document.cookie = `${THEME_COOKIE}=${theme}; path=/; max-age=${ONE_YEAR_S}; samesite=lax`;
  if (theme === 'device') delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
}
