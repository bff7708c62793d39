import { KitOrder } from "./models/orders/kit-order";
import { KitOrderOption } from "./models/orders/kit-order-option";
import { Offer } from "./models/orders/offer";
import { PurchaseOrder } from "./models/orders/purchase-order";
import { PurchaseOrderLine } from "./models/orders/purchase-order-line";
import { ShopOrder } from "./models/orders/shop-order";
import { ShopOrderComponent } from "./models/orders/shop-order-component";
import { Supplier } from "./models/orders/supplier";
import { Part } from "./models/parts/part";
import { StructureLine } from "./models/parts/structure-line";
import { ApiToken } from "./models/people/api-token";
import { Person } from "./models/people/person";
import { PersonLink } from "./models/people/person-link";
import { PersonRole } from "./models/people/person-role";
import { Session } from "./models/people/session";
import { Balance } from "./models/stock/balance";
import { Bin } from "./models/stock/bin";
import { Lot } from "./models/stock/lot";
import { Movement } from "./models/stock/movement";
import { MovementLeg } from "./models/stock/movement-leg";

// A service that joins models in one query imports this file for its effect.

Person.hasMany(PersonRole, { as: "roles", foreignKey: "personId" });
Person.hasMany(Session, { as: "sessions", foreignKey: "personId" });
Person.hasMany(ApiToken, { as: "tokens", foreignKey: "personId" });
Person.hasMany(PersonLink, { as: "links", foreignKey: "personId" });
PersonLink.belongsTo(Person, { as: "person", foreignKey: "personId" });
Session.belongsTo(Person, { as: "person", foreignKey: "personId" });
ApiToken.belongsTo(Person, { as: "person", foreignKey: "personId" });
PersonRole.belongsTo(Person, { as: "person", foreignKey: "personId" });

Part.hasMany(StructureLine, { as: "structure", foreignKey: "parentId" });
Part.hasMany(StructureLine, { as: "uses", foreignKey: "componentId" });
StructureLine.belongsTo(Part, { as: "parent", foreignKey: "parentId" });
StructureLine.belongsTo(Part, { as: "component", foreignKey: "componentId" });

Part.hasMany(Lot, { as: "lots", foreignKey: "partId" });
Part.hasMany(Balance, { as: "balances", foreignKey: "partId" });
Bin.hasMany(Balance, { as: "balances", foreignKey: "binId" });
Lot.hasMany(Balance, { as: "balances", foreignKey: "lotId" });
Lot.belongsTo(Part, { as: "part", foreignKey: "partId" });
Balance.belongsTo(Part, { as: "part", foreignKey: "partId" });
Balance.belongsTo(Bin, { as: "bin", foreignKey: "binId" });
Balance.belongsTo(Lot, { as: "lot", foreignKey: "lotId" });

Movement.hasMany(MovementLeg, { as: "legs", foreignKey: "movementId" });
Movement.belongsTo(Person, { as: "person", foreignKey: "personId" });
Movement.belongsTo(Movement, { as: "reversed", foreignKey: "reverses" });
MovementLeg.belongsTo(Movement, { as: "movement", foreignKey: "movementId" });
MovementLeg.belongsTo(Part, { as: "part", foreignKey: "partId" });
MovementLeg.belongsTo(Bin, { as: "bin", foreignKey: "binId" });
MovementLeg.belongsTo(Lot, { as: "lot", foreignKey: "lotId" });

Supplier.hasMany(Offer, { as: "offers", foreignKey: "supplierId" });
Supplier.hasMany(PurchaseOrder, { as: "purchaseOrders", foreignKey: "supplierId" });
Offer.belongsTo(Supplier, { as: "supplier", foreignKey: "supplierId" });
Offer.belongsTo(Part, { as: "part", foreignKey: "partId" });
Part.hasMany(Offer, { as: "offers", foreignKey: "partId" });
PurchaseOrder.belongsTo(Supplier, { as: "supplier", foreignKey: "supplierId" });
PurchaseOrder.hasMany(PurchaseOrderLine, { as: "lines", foreignKey: "purchaseOrderId" });
PurchaseOrderLine.belongsTo(PurchaseOrder, { as: "purchaseOrder", foreignKey: "purchaseOrderId" });
PurchaseOrderLine.belongsTo(Part, { as: "part", foreignKey: "partId" });

ShopOrder.belongsTo(Part, { as: "part", foreignKey: "partId" });
ShopOrder.hasMany(ShopOrderComponent, { as: "components", foreignKey: "shopOrderId" });
ShopOrderComponent.belongsTo(ShopOrder, { as: "shopOrder", foreignKey: "shopOrderId" });
ShopOrderComponent.belongsTo(Part, { as: "part", foreignKey: "partId" });

KitOrder.belongsTo(Part, { as: "part", foreignKey: "partId" });
KitOrder.hasMany(KitOrderOption, { as: "options", foreignKey: "kitOrderId" });
KitOrderOption.belongsTo(KitOrder, { as: "kitOrder", foreignKey: "kitOrderId" });
