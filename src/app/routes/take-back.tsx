export { TakeBackPage as Component } from '#src/features/withdrawals/components/take-back-page.js';
