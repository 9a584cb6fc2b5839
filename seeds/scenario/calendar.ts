/** The delivery zones by their keys; weekdays as in ISO 8601, 1 is Monday. */
export const ZONES = {
  town: {
    name: 'Withenbeck town',
    weekdays: [1, 2, 3, 4, 5, 6],
    cutOffTime: '16:00',
    leadDays: 1,
    deliveryChargeMinor: 0,
  },
  fell: { name: 'Fell side', weekdays: [1, 2, 3, 4, 5, 6], cutOffTime: '15:00', leadDays: 1, deliveryChargeMinor: 650 },
  coast: { name: 'Coast road', weekdays: [2, 3, 5, 6], cutOffTime: '15:00', leadDays: 1, deliveryChargeMinor: 850 },
} as const;
