export { analyseCaptureFile as default } from '@/lib/adapters/capture-worker/analyse-capture-file'
