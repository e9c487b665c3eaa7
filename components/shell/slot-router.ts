/**
 * Stands in for the router's stack of screens in the bundle (see metro.config.js): the app shows one `Slot`, which needs
 * this router and nothing that draws native screens.
 */
export { StackRouter } from 'expo-router/build/react-navigation/routers';

/** Asked for at the start to set flags of native screens; there are none. */
export function initScreensFeatureFlags() {}
