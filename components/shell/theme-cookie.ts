/** The cookie that the root layout reads to set <html data-theme>; it holds "light" or "dark", or is absent. */
export const themeCookie = 'theme'
