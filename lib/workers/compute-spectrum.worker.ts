export { computeSpectrum as default } from '@/lib/adapters/spectrum-worker/compute-spectrum'
