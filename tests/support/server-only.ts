// Stands in for the `server-only` marker package, which only the Next.js bundler understands.
export {}
