/** Apart from the pages' own code: most of them are left without a search. */
export const loadDialog = () => import('./SearchDialog');
