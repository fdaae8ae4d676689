/**
 * Guards who may do what: every role against every action, in the own organisation and another, as a
 * member and not, locked and open. The table is written out by hand; a rule that changes must change here.
 */
import { describe, expect, it } from "vitest";
import { canEditNode, canRecalculate, canViewNode } from "@/lib/policies/node";
import { canManagePeople, canManagePerson } from "@/lib/policies/people";
import {
  canCreateProject,
  canEditProject,
  canManageMembers,
  canSeeMoney,
  canViewProject,
  type ProjectFacts,
} from "@/lib/policies/project";
import { canEditRates, canViewRates } from "@/lib/policies/rates";
import { type Actor, RIGHTS, type Role, ROLE_RIGHTS, ROLES } from "@/lib/policies/roles";
import { canEditStockPlates } from "@/lib/policies/stock-plates";

const OWN = "own";
const OTHER = "other";

const actorOf = (role: Role): Actor => ({ personId: `the ${role}`, organisationId: OWN, role });

const projectOf = (organisationId: string, isMember: boolean, isLocked = false): ProjectFacts => ({
  id: "project",
  organisationId,
  isLocked,
  memberIds: new Set(isMember ? ROLES.map((role) => `the ${role}`) : ["somebody else"]),
});

const PLACES = {
  "member, own organisation": projectOf(OWN, true),
  "member, other organisation": projectOf(OTHER, true),
  "no member, own organisation": projectOf(OWN, false),
  "no member, other organisation": projectOf(OTHER, false),
  "member, own organisation, locked": projectOf(OWN, true, true),
} as const;
type Place = keyof typeof PLACES;

const RULES = {
  canViewProject,
  canManageMembers,
  canEditProject,
  canSeeMoney,
  canViewNode,
  canEditNode,
  canRecalculate,
} as const;
type Rule = keyof typeof RULES;

const all = [...ROLES];
const nobody: Role[] = [];

/** Rule, place, and the roles that may; everybody else may not. */
const TABLE: Readonly<Record<Rule, Readonly<Record<Place, readonly Role[]>>>> = {
  canViewProject: {
    "member, own organisation": all,
    "member, other organisation": all,
    "no member, own organisation": ["admin"],
    "no member, other organisation": nobody,
    "member, own organisation, locked": all,
  },
  canViewNode: {
    "member, own organisation": all,
    "member, other organisation": all,
    "no member, own organisation": ["admin"],
    "no member, other organisation": nobody,
    "member, own organisation, locked": all,
  },
  canManageMembers: {
    "member, own organisation": ["designer", "admin"],
    "member, other organisation": nobody,
    "no member, own organisation": ["admin"],
    "no member, other organisation": nobody,
    "member, own organisation, locked": ["designer", "admin"],
  },
  canEditProject: {
    "member, own organisation": ["designer"],
    "member, other organisation": nobody,
    "no member, own organisation": nobody,
    "no member, other organisation": nobody,
    "member, own organisation, locked": nobody,
  },
  canSeeMoney: {
    "member, own organisation": all,
    "member, other organisation": nobody,
    "no member, own organisation": ["admin"],
    "no member, other organisation": nobody,
    "member, own organisation, locked": all,
  },
  canEditNode: {
    "member, own organisation": ["designer"],
    "member, other organisation": ["designer"],
    "no member, own organisation": nobody,
    "no member, other organisation": nobody,
    "member, own organisation, locked": nobody,
  },
  canRecalculate: {
    "member, own organisation": ["designer", "estimator"],
    "member, other organisation": ["designer", "estimator"],
    "no member, own organisation": nobody,
    "no member, other organisation": nobody,
    "member, own organisation, locked": nobody,
  },
};

describe.each(Object.keys(RULES) as Rule[])("%s", (rule) => {
  describe.each(Object.keys(PLACES) as Place[])("%s", (place) => {
    it.each(ROLES)("%s", (role) => {
      expect(RULES[rule](actorOf(role), PLACES[place])).toBe(TABLE[rule][place].includes(role));
    });
  });
});

describe("what needs no project", () => {
  it.each(ROLES)("%s", (role) => {
    const actor = actorOf(role);
    expect(canCreateProject(actor)).toBe(role === "designer");
    expect(canEditStockPlates(actor)).toBe(role === "estimator" || role === "fabricator");
    expect(canViewRates(actor, { organisationId: OWN })).toBe(true);
    expect(canViewRates(actor, { organisationId: OTHER })).toBe(false);
    expect(canEditRates(actor, { organisationId: OWN })).toBe(role === "estimator");
    expect(canEditRates(actor, { organisationId: OTHER })).toBe(false);
    expect(canManagePeople(actor)).toBe(role === "admin");
    expect(canManagePerson(actor, { organisationId: OWN })).toBe(role === "admin");
    expect(canManagePerson(actor, { organisationId: OTHER })).toBe(false);
  });
});

it("gives every right to some role, and the checker none: whoever signs has had no hand in it", () => {
  const given = new Set(ROLES.flatMap((role) => [...ROLE_RIGHTS[role]]));
  expect([...given].sort()).toEqual([...RIGHTS].sort());
  expect([...ROLE_RIGHTS.checker]).toEqual([]);
});
