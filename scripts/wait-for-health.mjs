/**
 * wait-for-health.mjs URL PID: ends with 0 once the address answers well, with 1 when the process is gone
 * or two minutes have passed.
 */
const [, , url, pid] = process.argv;
if (url === undefined || pid === undefined) throw new Error("usage: wait-for-health.mjs URL PID");
const deadline = Date.now() + 120_000;

function isAlive() {
  try {
    process.kill(Number(pid), 0);
    return true;
  } catch {
    return false;
  }
}

/** @returns {Promise<string>} "" when well, else what was answered */
async function ask() {
  try {
    const response = await fetch(String(url), { signal: AbortSignal.timeout(30_000) });
    return response.ok ? "" : `${response.status}: ${(await response.text()).slice(0, 500)}`;
  } catch {
    return "no answer";
  }
}

let last = await ask();
while (last !== "" && isAlive() && Date.now() < deadline) {
  await new Promise((resolve) => setTimeout(resolve, 250));
  last = await ask();
}
if (last !== "") {
  console.error(`${url} is not well (${last}).`);
  process.exitCode = 1;
}
