import * as bench from './bench/route';
import * as benchSum from './bench/[sum]/route';
import * as cases from './cases/route';
import * as casesId from './cases/[id]/route';
import * as casesIdAcknowledgements from './cases/[id]/acknowledgements/route';
import * as casesIdAssign from './cases/[id]/assign/route';
import * as casesIdCall from './cases/[id]/call/route';
import * as casesIdCatches from './cases/[id]/catches/route';
import * as casesIdCatchesCatchIdEnd from './cases/[id]/catches/[catchId]/end/route';
import * as casesIdCatchesCatchIdReminder from './cases/[id]/catches/[catchId]/reminder/route';
import * as casesIdCatchesCatchIdWeighings from './cases/[id]/catches/[catchId]/weighings/route';
import * as casesIdCatchesCatchIdWeighingsWeighingIdTakeBack from './cases/[id]/catches/[catchId]/weighings/[weighingId]/take-back/route';
import * as casesIdClaims from './cases/[id]/claims/route';
import * as casesIdClaimsClaimIdSettle from './cases/[id]/claims/[claimId]/settle/route';
import * as casesIdCores from './cases/[id]/cores/route';
import * as casesIdCoresCoreIdSettle from './cases/[id]/cores/[coreId]/settle/route';
import * as casesIdDossiers from './cases/[id]/dossiers/route';
import * as casesIdDossiersDossierId from './cases/[id]/dossiers/[dossierId]/route';
import * as casesIdDossiersDossierIdAgain from './cases/[id]/dossiers/[dossierId]/again/route';
import * as casesIdDossiersDossierIdPdf from './cases/[id]/dossiers/[dossierId]/pdf/route';
import * as casesIdDossiersDossierIdSendings from './cases/[id]/dossiers/[dossierId]/sendings/route';
import * as casesIdDossiersDossierIdSendingsSendingIdAgain from './cases/[id]/dossiers/[dossierId]/sendings/[sendingId]/again/route';
import * as casesIdEvents from './cases/[id]/events/route';
import * as casesIdFindings from './cases/[id]/findings/route';
import * as casesIdFindingsFindingIdNotes from './cases/[id]/findings/[findingId]/notes/route';
import * as casesIdKit from './cases/[id]/kit/route';
import * as casesIdPhotos from './cases/[id]/photos/route';
import * as casesIdReasons from './cases/[id]/reasons/route';
import * as casesIdRecord from './cases/[id]/record/route';
import * as casesIdRepairPlan from './cases/[id]/repair-plan/route';
import * as casesIdRepairPlanCautions from './cases/[id]/repair-plan/cautions/route';
import * as casesIdRepairs from './cases/[id]/repairs/route';
import * as casesIdRepairsRepairIdEnd from './cases/[id]/repairs/[repairId]/end/route';
import * as casesIdRepairsRepairIdPlan from './cases/[id]/repairs/[repairId]/plan/route';
import * as casesIdRepairsRepairIdSteps from './cases/[id]/repairs/[repairId]/steps/route';
import * as casesIdBreakIns from './cases/[id]/break-ins/route';
import * as casesIdBreakInsRunIdEnd from './cases/[id]/break-ins/[runId]/end/route';
import * as casesIdBreakInsRunIdEvents from './cases/[id]/break-ins/[runId]/events/route';
import * as casesIdBreakInsRunIdHotCheck from './cases/[id]/break-ins/[runId]/hot-check/route';
import * as casesIdFittings from './cases/[id]/fittings/route';
import * as casesIdFittingsFittingIdFinish from './cases/[id]/fittings/[fittingId]/finish/route';
import * as casesIdFittingsFittingIdPoints from './cases/[id]/fittings/[fittingId]/points/route';
import * as casesIdRelease from './cases/[id]/release/route';
import * as casesIdReleases from './cases/[id]/releases/route';
import * as casesIdWatches from './cases/[id]/watches/route';
import * as casesIdWatchesWatchIdEnd from './cases/[id]/watches/[watchId]/end/route';
import * as casesIdWatchesWatchIdLinks from './cases/[id]/watches/[watchId]/links/route';
import * as casesIdWatchesWatchIdLinksLinkIdRevoke from './cases/[id]/watches/[watchId]/links/[linkId]/revoke/route';
import * as casesIdWatchesWatchIdReadings from './cases/[id]/watches/[watchId]/readings/route';
import * as casesIdWatchesWatchIdReadingsReadingIdTakeBack from './cases/[id]/watches/[watchId]/readings/[readingId]/take-back/route';
import * as casesIdWorkCautions from './cases/[id]/work-cautions/route';
import * as casesIdReopen from './cases/[id]/reopen/route';
import * as casesIdRulebook from './cases/[id]/rulebook/route';
import * as deviceCases from './device/cases/route';
import * as editionsId from './editions/[id]/route';
import * as fleetGate from './fleet/gate/route';
import * as fitsId from './fits/[id]/route';
import * as fitsIdStrike from './fits/[id]/strike/route';
import * as fitsIdTakeOut from './fits/[id]/take-out/route';
import * as jobs from './jobs/route';
import * as jobsIdRetry from './jobs/[id]/retry/route';
import * as limits from './limits/route';
import * as limitsIdWithdraw from './limits/[id]/withdraw/route';
import * as models from './models/route';
import * as modelsId from './models/[id]/route';
import * as modelsIdHide from './models/[id]/hide/route';
import * as modelsIdShow from './models/[id]/show/route';
import * as notices from './notices/route';
import * as noticesIdRead from './notices/[id]/read/route';
import * as noticesReadAll from './notices/read-all/route';
import * as people from './people/route';
import * as photosIdArrived from './photos/[id]/arrived/route';
import * as photosIdHidden from './photos/[id]/hidden/route';
import * as photosIdMarks from './photos/[id]/marks/route';
import * as photosIdPicture from './photos/[id]/picture/route';
import * as photosIdThumbnail from './photos/[id]/thumbnail/route';
import * as profile from './profile/route';
import * as profileNotices from './profile/notices/route';
import * as profileUnits from './profile/units/route';
import * as rulebook from './rulebook/route';
import * as search from './search/route';
import * as sites from './sites/route';
import * as sitesId from './sites/[id]/route';
import * as sitesIdGates from './sites/[id]/gates/route';
import * as sitesIdGatesGateIdRevoke from './sites/[id]/gates/[gateId]/revoke/route';
import * as units from './units/route';
import * as unitsId from './units/[id]/route';
import * as unitsIdBaseline from './units/[id]/baseline/route';
import * as unitsIdBaselines from './units/[id]/baselines/route';
import * as unitsIdBaselinesSetIdHide from './units/[id]/baselines/[setId]/hide/route';
import * as unitsIdFits from './units/[id]/fits/route';
import * as unitsIdHide from './units/[id]/hide/route';
import * as unitsIdHolds from './units/[id]/holds/route';
import * as unitsIdHoldsHoldIdLift from './units/[id]/holds/[holdId]/lift/route';
import * as unitsIdReadings from './units/[id]/readings/route';
import * as unitsIdReadingsReadingIdStrike from './units/[id]/readings/[readingId]/strike/route';
import * as unitsIdShow from './units/[id]/show/route';

/** Every route of the API by its path; a test holds this to the folders. */
export const ROUTES = {
  '/bench': bench,
  '/bench/{sum}': benchSum,
  '/cases': cases,
  '/cases/{id}': casesId,
  '/cases/{id}/acknowledgements': casesIdAcknowledgements,
  '/cases/{id}/assign': casesIdAssign,
  '/cases/{id}/call': casesIdCall,
  '/cases/{id}/catches': casesIdCatches,
  '/cases/{id}/catches/{catchId}/end': casesIdCatchesCatchIdEnd,
  '/cases/{id}/catches/{catchId}/reminder': casesIdCatchesCatchIdReminder,
  '/cases/{id}/catches/{catchId}/weighings': casesIdCatchesCatchIdWeighings,
  '/cases/{id}/catches/{catchId}/weighings/{weighingId}/take-back': casesIdCatchesCatchIdWeighingsWeighingIdTakeBack,
  '/cases/{id}/claims': casesIdClaims,
  '/cases/{id}/claims/{claimId}/settle': casesIdClaimsClaimIdSettle,
  '/cases/{id}/cores': casesIdCores,
  '/cases/{id}/cores/{coreId}/settle': casesIdCoresCoreIdSettle,
  '/cases/{id}/dossiers': casesIdDossiers,
  '/cases/{id}/dossiers/{dossierId}': casesIdDossiersDossierId,
  '/cases/{id}/dossiers/{dossierId}/again': casesIdDossiersDossierIdAgain,
  '/cases/{id}/dossiers/{dossierId}/pdf': casesIdDossiersDossierIdPdf,
  '/cases/{id}/dossiers/{dossierId}/sendings': casesIdDossiersDossierIdSendings,
  '/cases/{id}/dossiers/{dossierId}/sendings/{sendingId}/again': casesIdDossiersDossierIdSendingsSendingIdAgain,
  '/cases/{id}/events': casesIdEvents,
  '/cases/{id}/findings': casesIdFindings,
  '/cases/{id}/findings/{findingId}/notes': casesIdFindingsFindingIdNotes,
  '/cases/{id}/kit': casesIdKit,
  '/cases/{id}/photos': casesIdPhotos,
  '/cases/{id}/reasons': casesIdReasons,
  '/cases/{id}/record': casesIdRecord,
  '/cases/{id}/repair-plan': casesIdRepairPlan,
  '/cases/{id}/repair-plan/cautions': casesIdRepairPlanCautions,
  '/cases/{id}/repairs': casesIdRepairs,
  '/cases/{id}/repairs/{repairId}/end': casesIdRepairsRepairIdEnd,
  '/cases/{id}/repairs/{repairId}/plan': casesIdRepairsRepairIdPlan,
  '/cases/{id}/repairs/{repairId}/steps': casesIdRepairsRepairIdSteps,
  '/cases/{id}/break-ins': casesIdBreakIns,
  '/cases/{id}/break-ins/{runId}/end': casesIdBreakInsRunIdEnd,
  '/cases/{id}/break-ins/{runId}/events': casesIdBreakInsRunIdEvents,
  '/cases/{id}/break-ins/{runId}/hot-check': casesIdBreakInsRunIdHotCheck,
  '/cases/{id}/fittings': casesIdFittings,
  '/cases/{id}/fittings/{fittingId}/finish': casesIdFittingsFittingIdFinish,
  '/cases/{id}/fittings/{fittingId}/points': casesIdFittingsFittingIdPoints,
  '/cases/{id}/release': casesIdRelease,
  '/cases/{id}/releases': casesIdReleases,
  '/cases/{id}/watches': casesIdWatches,
  '/cases/{id}/watches/{watchId}/end': casesIdWatchesWatchIdEnd,
  '/cases/{id}/watches/{watchId}/links': casesIdWatchesWatchIdLinks,
  '/cases/{id}/watches/{watchId}/links/{linkId}/revoke': casesIdWatchesWatchIdLinksLinkIdRevoke,
  '/cases/{id}/watches/{watchId}/readings': casesIdWatchesWatchIdReadings,
  '/cases/{id}/watches/{watchId}/readings/{readingId}/take-back': casesIdWatchesWatchIdReadingsReadingIdTakeBack,
  '/cases/{id}/work-cautions': casesIdWorkCautions,
  '/cases/{id}/reopen': casesIdReopen,
  '/cases/{id}/rulebook': casesIdRulebook,
  '/device/cases': deviceCases,
  '/editions/{id}': editionsId,
  '/fleet/gate': fleetGate,
  '/fits/{id}': fitsId,
  '/fits/{id}/strike': fitsIdStrike,
  '/fits/{id}/take-out': fitsIdTakeOut,
  '/jobs': jobs,
  '/jobs/{id}/retry': jobsIdRetry,
  '/limits': limits,
  '/limits/{id}/withdraw': limitsIdWithdraw,
  '/models': models,
  '/models/{id}': modelsId,
  '/models/{id}/hide': modelsIdHide,
  '/models/{id}/show': modelsIdShow,
  '/notices': notices,
  '/notices/{id}/read': noticesIdRead,
  '/notices/read-all': noticesReadAll,
  '/people': people,
  '/photos/{id}/arrived': photosIdArrived,
  '/photos/{id}/hidden': photosIdHidden,
  '/photos/{id}/marks': photosIdMarks,
  '/photos/{id}/picture': photosIdPicture,
  '/photos/{id}/thumbnail': photosIdThumbnail,
  '/profile': profile,
  '/profile/notices': profileNotices,
  '/profile/units': profileUnits,
  '/rulebook': rulebook,
  '/search': search,
  '/sites': sites,
  '/sites/{id}': sitesId,
  '/sites/{id}/gates': sitesIdGates,
  '/sites/{id}/gates/{gateId}/revoke': sitesIdGatesGateIdRevoke,
  '/units': units,
  '/units/{id}': unitsId,
  '/units/{id}/baseline': unitsIdBaseline,
  '/units/{id}/baselines': unitsIdBaselines,
  '/units/{id}/baselines/{setId}/hide': unitsIdBaselinesSetIdHide,
  '/units/{id}/fits': unitsIdFits,
  '/units/{id}/hide': unitsIdHide,
  '/units/{id}/holds': unitsIdHolds,
  '/units/{id}/holds/{holdId}/lift': unitsIdHoldsHoldIdLift,
  '/units/{id}/readings': unitsIdReadings,
  '/units/{id}/readings/{readingId}/strike': unitsIdReadingsReadingIdStrike,
  '/units/{id}/show': unitsIdShow,
};
