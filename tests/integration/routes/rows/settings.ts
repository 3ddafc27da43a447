import { PERMITTED } from '@/lib/auth/permissions';
import { ANYONE } from '@/lib/auth/roles';
import { invite } from '@/lib/services/invitation/invite';
import { feature } from '../row';

const PEOPLE = PERMITTED['people.manage'];
const SITES = PERMITTED['site.manage'];
const ORGANISATION = PERMITTED['organisation.manage'];

export const settings = feature({
  async prepare({ tenant, as, password }) {
    const colleague = await tenant.addPerson();
    const { invitationId } = await invite({ ctx: as('administrator'), input: { email: `${crypto.randomUUID()}@people.test`, roles: ['technician'] } });
    return { personId: colleague.person.id, invitationId, siteId: tenant.siteId, organisationId: tenant.organisationId, password };
  },
  rows: [
    { page: '(signed-in)/settings', roles: ANYONE, redirectsTo: '/settings/profile' },
    { page: '(signed-in)/settings/profile', roles: ANYONE },
    { page: '(signed-in)/settings/units', roles: ANYONE },
    { page: '(signed-in)/settings/people', roles: PEOPLE },
    { page: '(signed-in)/settings/people/invite', roles: PEOPLE },
    { page: '(signed-in)/settings/people/[id]', roles: PEOPLE, params: ({ personId }) => ({ id: personId }) },
    { page: '(signed-in)/settings/sites', roles: SITES },
    { page: '(signed-in)/settings/sites/new', roles: SITES },
    { page: '(signed-in)/settings/sites/[id]', roles: SITES, params: ({ siteId }) => ({ id: siteId }) },
    { page: '(signed-in)/settings/organisation', roles: ORGANISATION },
    { page: '(signed-in)/settings/audit', roles: PERMITTED['audit.see'], query: ({ personId }) => ({ person: personId, entity: 'site', from: '2026-01-01', until: '2026-12-31', page: '2' }) },

    { action: '(signed-in)/settings/profile', name: 'renamePerson', roles: ANYONE, form: () => ({ name: 'Another Name' }) },
    { action: '(signed-in)/settings/profile', name: 'setPassword', roles: ANYONE, endsSession: true, form: ({ password }) => ({ current: password, password: 'another password, a new one' }) },
    { action: '(signed-in)/settings/profile', name: 'endEverySession', roles: ANYONE, endsSession: true, takesNothing: true, form: () => ({}) },
    { action: '(signed-in)/settings/profile', name: 'goOnElsewhere', roles: ANYONE, form: ({ organisationId }) => ({ organisationId }) },
    { action: '(signed-in)/settings/units', name: 'saveUnits', roles: ANYONE, form: () => ({ pressure: 'bar' }) },
    { action: '(signed-in)/settings/people', name: 'invitePerson', roles: PEOPLE, form: () => ({ email: `${crypto.randomUUID()}@people.test`, roles: ['technician', 'manager'] }) },
    { action: '(signed-in)/settings/people', name: 'sendInvitationAgain', roles: PEOPLE, form: ({ invitationId }) => ({ invitationId }) },
    { action: '(signed-in)/settings/people', name: 'takeInvitationBack', roles: PEOPLE, form: ({ invitationId }) => ({ invitationId }) },
    {
      action: '(signed-in)/settings/people',
      name: 'saveMember',
      roles: PEOPLE,
      form: ({ personId, siteId }) => ({ personId, siteId, roles: ['manager'], mayRelease: 'on', releaseBasis: 'Inspector' }),
    },
    { action: '(signed-in)/settings/people', name: 'letGo', roles: PEOPLE, form: ({ personId }) => ({ personId }) },
    { action: '(signed-in)/settings/sites', name: 'addSite', roles: SITES, form: () => ({ name: crypto.randomUUID(), timeZone: 'Europe/Lisbon' }) },
    { action: '(signed-in)/settings/sites', name: 'changeSite', roles: SITES, form: ({ siteId }) => ({ siteId, name: crypto.randomUUID(), timeZone: 'Europe/Lisbon' }) },
    {
      action: '(signed-in)/settings/organisation',
      name: 'saveOrganisation',
      roles: ORGANISATION,
      form: () => ({ name: 'Renamed', country: 'PT', currency: 'EUR', labourRatePerHour: '98.50' }),
    },
  ],
});
