/** Header in which proxy.ts hands the asked-for path to the pages. */
export const PATH_HEADER = "x-panelwright-path";
