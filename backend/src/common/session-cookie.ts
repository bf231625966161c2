export const SESSION_COOKIE = 'bandledger.sid';
