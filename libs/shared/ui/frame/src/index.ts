// What an application's frame needs, and nothing of what pages show: a bundler that splits by files keeps everything
// that one index names together, so the first load of an application imports this entry and never `shared/ui` itself.
export { AdminShell } from '../../src/shell/admin-shell';
export { CutOff } from '../../src/shell/cut-off';
export { Disclosure } from '../../src/shell/disclosure';
export { FrameIcon } from '../../src/icons/frame-icon';
export { MenuItem } from '../../src/shell/menu-item';
export type { NavLink } from '../../src/shell/nav-link';
export { provideHeadingFocus } from '../../src/shell/heading-focus';
export { providePageTitle } from '../../src/shell/page-title';
export { StorefrontShell } from '../../src/shell/storefront-shell';
export { Toast, type ToastMessage } from '../../src/toast/toast';
