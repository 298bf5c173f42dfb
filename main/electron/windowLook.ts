/** The page's own grounds (`--ground` in `renderer/styles/tokens.css`), so that nothing flashes before it has drawn itself. */
export const GROUND = { light: '#f5f4f1', dark: '#16191c' };

/** As the page names itself in a browser window. */
export const titleOf = (displayName: string, unsaved: boolean): string =>
  `${unsaved ? '* ' : ''}${displayName === '' ? '' : `${displayName} — `}Sunder`;
