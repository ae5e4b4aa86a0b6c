import localFont from 'next/font/local'

const sans = localFont({
  variable: '--face-sans',
  display: 'swap',
  src: [
    { path: '../public/fonts/SourceSans3-Regular.woff2', weight: '400', style: 'normal' },
    { path: '../public/fonts/SourceSans3-It.woff2', weight: '400', style: 'italic' },
    { path: '../public/fonts/SourceSans3-Semibold.woff2', weight: '600', style: 'normal' },
  ],
})

const serif = localFont({
  variable: '--face-serif',
  display: 'swap',
  src: [
    { path: '../public/fonts/SourceSerif4-Regular.woff2', weight: '400', style: 'normal' },
    { path: '../public/fonts/SourceSerif4-Semibold.woff2', weight: '600', style: 'normal' },
  ],
})

const mono = localFont({
  variable: '--face-mono',
  display: 'swap',
  src: [
    { path: '../public/fonts/SourceCodePro-Regular.woff2', weight: '400', style: 'normal' },
    { path: '../public/fonts/SourceCodePro-Semibold.woff2', weight: '600', style: 'normal' },
  ],
})

/** Class names for <html>: they define --face-sans, --face-serif and --face-mono. */
export const fontVariables = [sans.variable, serif.variable, mono.variable].join(' ')
