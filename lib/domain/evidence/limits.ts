const mebibyte = 1024 * 1024

/** What one engagement may hold and one capture may weigh; the limit of a single file is a setting. */
export const evidenceLimits = {
  captureTextBytes: 256 * mebibyte,
  nameLength: 255,
  filesPerEngagement: 1000,
  bytesPerEngagement: 50 * 1024 * mebibyte,
} as const
