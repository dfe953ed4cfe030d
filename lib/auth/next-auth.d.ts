import 'next-auth'
import 'next-auth/jwt'

declare module 'next-auth' {
  interface User {
    id: string
    /** The session's row. */
    signIn: string
  }
}

declare module 'next-auth/jwt' {
  interface JWT {
    signIn?: string
  }
}
