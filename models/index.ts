import type { Sequelize } from "sequelize";
import { initAccessToken } from "./access-token";
import { initAngle } from "./angle";
import { initAuditEntry } from "./audit-entry";
import { initCarbonFactor } from "./carbon-factor";
import { initCarbonTable } from "./carbon-table";
import { initComparison } from "./comparison";
import { initFastener } from "./fastener";
import { initFastenerGrade } from "./fastener-grade";
import { initLookUpTable } from "./look-up-table";
import { initNode } from "./node";
import { initNodeExclusion } from "./node-exclusion";
import { initNodeRevision } from "./node-revision";
import { initOrganisation } from "./organisation";
import { initPerson } from "./person";
import { initProject } from "./project";
import { initProjectMember } from "./project-member";
import { initRateBook } from "./rate-book";
import { initRateLine } from "./rate-line";
import { initSection } from "./section";
import { initSession } from "./session";
import { initSignInAttempt } from "./sign-in-attempt";
import { initSteel } from "./steel";
import { initStockPlate } from "./stock-plate";
import { initTimeConstant } from "./time-constant";
import { initTimeRule } from "./time-rule";
import { initTimeTable } from "./time-table";

/**
 * Every model by name: a bundler cannot follow a read folder. Tables refer to each other by foreign
 * keys in the migrations; repositories join by hand, so no associations are declared here.
 */
const initialisers: readonly ((sequelize: Sequelize) => void)[] = [
  initOrganisation,
  initPerson,
  initSession,
  initAccessToken,
  initSignInAttempt,
  initProject,
  initProjectMember,
  initNode,
  initNodeRevision,
  initNodeExclusion,
  initComparison,
  initAuditEntry,
  initSection,
  initAngle,
  initSteel,
  initFastener,
  initFastenerGrade,
  initStockPlate,
  initRateBook,
  initRateLine,
  initTimeTable,
  initTimeRule,
  initTimeConstant,
  initLookUpTable,
  initCarbonTable,
  initCarbonFactor,
];

/** Binds every model to a pool. */
export function registerModels(sequelize: Sequelize): void {
  for (const initialise of initialisers) initialise(sequelize);
}
