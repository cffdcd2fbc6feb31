import { nothing } from '@/lib/api/others';

export const { GET, HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = nothing;
