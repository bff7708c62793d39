/** Selects `KitOrderRow`s; a condition and an order follow. */
export const SELECT_KIT_ORDERS = `SELECT o.id, o.number, p.part_number AS kit, p.description AS kitDescription,
  o.serial, o.wanted_on AS wantedOn, o.customer, o.priority, o.state, o.note, o.version,
  (SELECT GROUP_CONCAT(k.option_code ORDER BY k.option_code SEPARATOR '\\n')
     FROM kit_order_option k WHERE k.kit_order_id = o.id) AS optionCodes
  FROM kit_order o JOIN part p ON p.id = o.part_id`;
