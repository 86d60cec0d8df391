/** Names by which the service's parts ask for accounts. */
export const ACCOUNTS = Symbol('accounts');
