import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { createModel } from '@/lib/services/compressor-model/create';
import { hideModel } from '@/lib/services/compressor-model/hide';
import { readModelForm } from '@/lib/services/compressor-model/read';
import { feature } from '../row';

const SEE = PERMITTED['model.see'];
const EDIT = PERMITTED['model.edit'];
const PAGES = '(signed-in)/models';

export const models = feature({
  async prepare({ as }) {
    const ctx = as('engineer');
    const [modelId, hiddenId] = [newId(), newId()];
    for (const id of [modelId, hiddenId]) await createModel({ ctx, input: { id, name: id, bore: '3 5/8' } });
    await hideModel({ ctx, input: { modelId: hiddenId, reason: 'Out of use' } });
    const { version } = await readModelForm({ ctx, input: { modelId } });
    return { modelId, hiddenId, version };
  },
  rows: [
    { page: PAGES, roles: SEE, query: () => ({ q: 'a', drain: 'small-hole', sort: 'on-units', direction: 'desc', page: '1' }) },
    { page: `${PAGES}/new`, roles: EDIT },
    { page: `${PAGES}/[id]`, roles: SEE, params: ({ modelId }) => ({ id: modelId }) },
    { page: `${PAGES}/[id]/edit`, roles: EDIT, params: ({ modelId }) => ({ id: modelId }) },

    { action: PAGES, name: 'addModel', roles: EDIT, form: () => ({ id: newId(), name: newId(), displacement: '19.4', driveRatio: '1.5:1' }) },
    { action: PAGES, name: 'changeModel', roles: EDIT, form: ({ modelId, version }) => ({ modelId, version, name: newId() }) },
    { action: PAGES, name: 'hideModel', roles: EDIT, form: ({ modelId }) => ({ modelId, reason: 'Out of use' }) },
    { action: PAGES, name: 'showModel', roles: EDIT, form: ({ hiddenId }) => ({ modelId: hiddenId }) },
  ],
});
