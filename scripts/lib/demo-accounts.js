/**
 * Lines that tell who can sign in to the demo firm.
 * @returns {string[]}
 */
export const demoAccounts = () => [];
