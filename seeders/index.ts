import { catalogue } from "./catalog";
import { demoOrganisation } from "./demo-organisation";
import { figures } from "./prices";
import type { Seeder } from "./seeder";

/**
 * Every seeder in the order of running: what others refer to comes first. Catalogue and figures
 * before the demo organisation, whose project uses them.
 */
export const seeders: readonly Seeder[] = [catalogue, figures, demoOrganisation];
