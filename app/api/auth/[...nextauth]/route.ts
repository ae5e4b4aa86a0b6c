import { authHandler } from '@/lib/server/auth-handler'

export { authHandler as GET, authHandler as POST }
