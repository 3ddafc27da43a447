/** Apart from the page's own code: most pages of a case open no photo. */
export const loadDialog = () => import('./PhotoDialog');
