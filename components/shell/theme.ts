/** What the person chose: a fixed theme, or whatever the device asks for. */
export const themes = ['device', 'light', 'dark'] as const;
export type Theme = (typeof themes)[number];

export const THEME_COOKIE = 'theme';

/** The theme a cookie stands for; anything unknown means the device decides. */
export function themeFrom(cookie: string | undefined): Theme {
  return themes.find((theme) => theme === cookie) ?? 'device';
}
