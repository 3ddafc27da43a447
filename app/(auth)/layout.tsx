/** The pages before signing in look like the other public ones. */
export { default } from '../(public)/layout';
