export { renderReport as default } from '@/pdf/render-report'
