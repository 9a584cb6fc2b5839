export { ACCESS_TOKEN_SOURCE, type AccessTokenSource } from './access-token';
export { ApiClient, type FileDownload, type UploadStep } from './api-client';
export { ApiProblem, asProblem } from './api-problem';
export { LiveEvents, type LiveChange } from './live-events';
export { failed, idle, loaded, loading, type Remote } from './remote';
export { saveFile } from './save-file';
