/** id-kp-documentSigning (RFC 9336) and id-kp-emailProtection (RFC 5280, 4.2.1.12). */
export const SIGNING_KEY_USAGES = ['1.3.6.1.5.5.7.3.36', '1.3.6.1.5.5.7.3.4'] as const
