/** Where a view is found again: addresses and links. */
export { parseAddress, formatAddress, hrefTo, currentAddress } from "./address.js";
export { link } from "./link.js";
