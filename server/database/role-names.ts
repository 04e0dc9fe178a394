/** The roles that serve: made once a cluster by the owner, who migrates. */
export const WEB_ROLE = 'counterpoise_web';
export const WORKER_ROLE = 'counterpoise_worker';
