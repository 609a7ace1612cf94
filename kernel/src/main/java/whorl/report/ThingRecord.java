package whorl.report;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.eval.Value;
import whorl.laws.ThingSort;
import whorl.mechanics.body.Body;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.BoundForce;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;

/**
 * Things in space for tools, all numbers in coherent units: a point as an array of coordinates, a
 * tensor as an array of rows, anything else as an object with its parts by name.
 */
final class ThingRecord {
  private ThingRecord() {}

  /**
   * The unit of the numbers of a point or a tensor; nothing for what has parts of several units.
   */
  static String unit(ThingSort sort) {
    return switch (sort) {
      case POINT -> "m";
      case INERTIA -> "kg·m²";
      case AXIS, FRAME, BODY, FORCE, MOTION, COURSE -> "";
    };
  }

  static JsonElement of(Value.Thing thing) {
    Object content = thing.content();
    return switch (thing.sort()) {
      case POINT -> array(((Point) content).position());
      case AXIS -> axis((Axis) content);
      case FRAME -> frame((Frame) content);
      case BODY -> body((Body) content);
      case FORCE -> force((BoundForce) content);
      case INERTIA -> tensor((InertiaTensor) content);
      case MOTION, COURSE -> new JsonPrimitive(thing.sort().words());
    };
  }

  private static JsonObject axis(Axis axis) {
    var object = new JsonObject();
    object.add("through", array(axis.through().position()));
    object.add("along", array(axis.along()));
    return object;
  }

  private static JsonObject frame(Frame frame) {
    var object = new JsonObject();
    object.add("origin", array(frame.origin().position()));
    object.add("x", array(frame.toWorld(Vector3D.PLUS_I)));
    object.add("y", array(frame.toWorld(Vector3D.PLUS_J)));
    object.add("z", array(frame.toWorld(Vector3D.PLUS_K)));
    object.add("velocity", array(frame.origin().velocity()));
    object.add("turning", array(frame.angularVelocity()));
    return object;
  }

  private static JsonObject body(Body body) {
    var object = new JsonObject();
    object.addProperty("mass", body.mass());
    body.volume().ifPresent(volume -> object.addProperty("volume", volume));
    object.add("centre", array(body.centre().position()));
    object.add("inertia", tensor(body.massProperties().atCentre()));
    return object;
  }

  private static JsonObject force(BoundForce force) {
    var object = new JsonObject();
    object.add("force", array(force.force()));
    object.add("at", array(force.at().position()));
    return object;
  }

  private static JsonArray tensor(InertiaTensor tensor) {
    var rows = new JsonArray();
    rows.add(array(new Vector3D(tensor.xx(), tensor.xy(), tensor.zx())));
    rows.add(array(new Vector3D(tensor.xy(), tensor.yy(), tensor.yz())));
    rows.add(array(new Vector3D(tensor.zx(), tensor.yz(), tensor.zz())));
    return rows;
  }

  private static JsonArray array(Vector3D v) {
    var parts = new JsonArray();
    parts.add(v.getX());
    parts.add(v.getY());
    parts.add(v.getZ());
    return parts;
  }
}
