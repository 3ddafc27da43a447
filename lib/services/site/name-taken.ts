import { conflict } from '@/lib/errors';

export const siteNameTaken = () => conflict('Another site has this name.', { name: 'Give it a name of its own.' });
