import { formatQuantity, significant } from '@/lib/units';

export const whole = (value: number): string => formatQuantity(value, 'count', 6);
export const percent = (share: number): string => `${significant(100 * share, 2)} %`;
export const milliseconds = (time: number): string => `${significant(time, 2)} ms`;
