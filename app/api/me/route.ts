import { route } from "@/lib/http/route";
import { presentMe } from "@/lib/presenters/present-me";

export const GET = route({ access: "signed-in", run: ({ actor }) => Promise.resolve(presentMe(actor)) });
