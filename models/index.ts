import type { Sequelize } from "sequelize";
import { initAngle } from "./angle";
import { initAuditEntry } from "./audit-entry";
import { initComparison } from "./comparison";
import { initFastener } from "./fastener";
import { initFastenerGrade } from "./fastener-grade";
import { initNode } from "./node";
import { initNodeExclusion } from "./node-exclusion";
import { initNodeRevision } from "./node-revision";
import { initOrganisation } from "./organisation";
import { initPerson } from "./person";
import { initProject } from "./project";
import { initProjectMember } from "./project-member";
import { initSection } from "./section";
import { initSession } from "./session";
import { initSignInAttempt } from "./sign-in-attempt";
import { initSteel } from "./steel";
import { initStockPlate } from "./stock-plate";

/**
 * Every model by name: a bundler cannot follow a read folder. Tables refer to each other by foreign
 * keys in the migrations; repositories join by hand, so no associations are declared here.
 */
const initialisers: readonly ((sequelize: Sequelize) => void)[] = [
  initOrganisation,
  initPerson,
  initSession,
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
];

/** Binds every model to a pool. */
export function registerModels(sequelize: Sequelize): void {
  for (const initialise of initialisers) initialise(sequelize);
}
