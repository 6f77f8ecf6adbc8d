/** Days after the camp's last day for which food, access and contact details are kept; said on the page that asks. */
export const NEEDS_KEPT_DAYS = 30;
