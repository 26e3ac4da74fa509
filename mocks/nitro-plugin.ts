import { registerFakes } from './register'

/** The fakes in `npm run dev`, in the process that serves and in no other. */
export default registerFakes
