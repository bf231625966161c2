/** The server's types under the names that screens use; the shapes come from the API document (`generate:api`). */
import type { components } from './schema';

type Schemas = components['schemas'];

// Engine: what goes in
export type GbwCase = Schemas['GbwCase'];
export const GBW_CASES: readonly GbwCase[] = ['typical', 'minimum', 'minimumHot'];
export type Grade = Schemas['Grade'];
export type Lifecycle = Schemas['Lifecycle'];
export type DeviceKind = Schemas['DeviceKind'];
export type DatasheetValue = Schemas['DatasheetValue'];
export type PriceBreak = Schemas['PriceBreak'];
export type Quote = Schemas['Quote'];
export type VoltageFeedbackDevice = Schemas['VoltageFeedbackDevice'];
export type CurrentFeedbackDevice = Schemas['CurrentFeedbackDevice'];
export type MatchedBlockDevice = Schemas['MatchedBlockDevice'];
export type Device = Schemas['Device'];
export type StageKind = Schemas['StageKind'];
export type VoltageFeedbackTopology = Schemas['VoltageFeedbackTopology'];
export type CurrentFeedbackTopology = Schemas['CurrentFeedbackTopology'];
export type VoltageFeedbackStage = Schemas['VoltageFeedbackStage'];
export type CurrentFeedbackStage = Schemas['CurrentFeedbackStage'];
export type RcSectionStage = Schemas['RcSectionStage'];
export type MatchedBlockStage = Schemas['MatchedBlockStage'];
export type FeedbackStage = VoltageFeedbackStage | CurrentFeedbackStage;
export type Stage = Schemas['Stage'];
export const MAXIMUM_STAGES = 24;
export type LevelKind = Schemas['LevelKind'];
export type VoltageSource = Schemas['VoltageSource'];
export type CurrentSource = Schemas['CurrentSource'];
export type Source = Schemas['Source'];
export type Load = Schemas['Load'];
export type GainBasis = Schemas['GainBasis'];
export type Band = Schemas['Band'];
export type Supply = Schemas['Supply'];
export type Requirements = Schemas['Requirements'];
/** The generator drops the discriminator of a union behind `allOf`; here it is put back. */
export type Specification = Omit<Schemas['Specification'], 'source'> & { readonly source: Source };
type WithSpecification<T> = Omit<T, 'specification'> & { readonly specification: Specification };
export type Policy = Schemas['Policy'];

// Engine: what comes out
export type Verdict = Schemas['Verdict'];
export type Unit = Schemas['Unit'];
export type Figure = Schemas['Figure'];
export type Money = Schemas['Money'];
export type CheckId = Schemas['CheckId'];
export type Check = Schemas['Check'];
export type Remedy = Schemas['Remedy'];
export type VerdictReport = Schemas['VerdictReport'];
export type DataMark = Schemas['DataMark'];
export type Lane = Schemas['Lane'];
export type StageFigureKey = keyof Schemas['StageFigures'];
export type ChainFigureKey = Schemas['ChainFigureKey'];
export type StageCaseReport = Schemas['StageCaseReport'];
export type StageReport = Schemas['StageReport'];
export type ChainCaseReport = Schemas['ChainCaseReport'];
export type HeadlineItem = Schemas['HeadlineItem'];
export type FrequencyAxis = Schemas['FrequencyAxis'];
export type ChainReport = Schemas['ChainReport'];
export type CurveCase = Schemas['CurveCase'];
export type Curves = Schemas['Curves'];
export type CurveRequest = Schemas['CurveRequest'];
export type Working = Schemas['Working'];
export type WorkingDatum = Schemas['WorkingDatum'];
export type WorkingStep = Schemas['WorkingStep'];
export type WorkingRequest = Schemas['WorkingRequest'];
export type StageNeed = Schemas['StageNeed'];
export type CandidateReport = Schemas['CandidateReport'];
export type CandidatesReport = Schemas['CandidatesReport'];
export type CalculationRequest = WithSpecification<Schemas['CalculationRequest']>;
export type CalculationResponse = Schemas['CalculationResult'];

// Session and people
export type Role = Schemas['Role'];
export type SessionUser = Schemas['SessionUserDto'];
export type DemoAccount = Schemas['DemoAccountDto'];
export type Session = Schemas['SessionDto'];
export type SignedIn = Schemas['SignedInDto'];
export type UserRow = Schemas['UserDto'];
export type CreatedUser = Schemas['CreatedUserDto'];
export type PasswordLink = Schemas['PasswordLinkDto'];
export type PersonRef = Schemas['PersonRef'];

// Projects, chains, options
export type ProjectRow = Schemas['ProjectListItem'];
export type Project = Schemas['Project'];
export type OptionSummary = Schemas['OptionSummary'];
export type ChainRow = Schemas['ChainListItem'];
export type ChainOptionRow = Schemas['ChainOption'];
export type Chain = WithSpecification<Schemas['Chain']>;
export type OptionDto = Schemas['Option'];
export type Desk = Schemas['Desk'];
export type DeskChain = Schemas['OverChain'];

// Devices
export type DeviceDto = Schemas['LibraryDevice'];
export type DeviceBody = Schemas['DeviceBody'];
export type DeviceList = Schemas['DeviceList'];
export type DeviceUse = Schemas['DeviceUse'];
export type DeviceUses = Schemas['DeviceUses'];
export type QuoteBody = Schemas['SetQuote'];
