export { can, roleFor, rolesOnJob } from './can';
export type { Actor, JobScope, PermissionAnswer } from './can';
export { commandGrants, commandPermission } from './commands';
export { grants, isJobPermission } from './grants';
export type { CommandPermission, HousePermission, JobPermission, Permission } from './grants';
export { roles } from './roles';
export type { Role } from './roles';
