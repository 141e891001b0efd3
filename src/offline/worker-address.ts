const POLICY = "fadewright-worker";
/** Beside the page, wherever that is; a worker's scope is the folder that it lies in. */
const ADDRESS = "./sw.js";

/** What this needs of the browser's Trusted Types, which not every browser has. */
interface PolicyMaker {
  createPolicy(
    name: string,
    rules: { createScriptURL(address: string): string },
  ): { createScriptURL(address: string): string };
}

/**
 * Address of the service worker, in the form that the page's security policy asks for: text alone
 * would be refused there. May be called once, the policy allows no second one of its name.
 */
export function workerAddress(): string {
  const { trustedTypes } = globalThis as { trustedTypes?: PolicyMaker };
  if (trustedTypes === undefined) return ADDRESS;
  const policy = trustedTypes.createPolicy(POLICY, {
    createScriptURL(address) {
      if (address === ADDRESS) return address;
      throw new RangeError(`createScriptURL: address: got ${address}`);
    },
  });
  return policy.createScriptURL(ADDRESS);
}
