const specials = String.raw`\s\p{Cc}\p{Cf}"(),:;<>@[\]\\`
const oneAddress = new RegExp(`^[^${specials}]+@[^${specials}]+$`, 'u')

/**
 * Whether a text can only be read as a single address. Lists, display names, comments, quotes, line breaks and letters
 * that normalisation would change are how a message reaches somebody else.
 */
export const isOnePlainAddress = (text: string): boolean =>
  text.length <= 254 && text.normalize('NFKC') === text && oneAddress.test(text)
