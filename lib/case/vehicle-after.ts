import { stateAfter } from '@/lib/diagnose/set-up';
import type { SetUp } from '@/lib/diagnose/types';

/** Where the vehicle stands once a check was made, as a case keeps it. */
export function vehicleAfter(state: SetUp, setUp: SetUp): SetUp {
  const { access, ...rest } = stateAfter({ ...state, access: state.access ?? [] }, setUp);
  return { ...rest, access: [...access] };
}
