export { handleAuth } from './handle-auth';
