package clampwright.joint;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;

/**
 * A bolted joint: one bolt, its stack in order from the head, and how it is to be judged.
 *
 * @param fastener bolt and anchor
 * @param elements washers and layers, head side first; may be empty in a new sketch
 * @param headWasherRule for a washer that touches the head
 * @param nutWasherRule for a washer that touches the nut
 * @param method angle rule, stiffness method, bolt ends
 * @param tightening preload and what is lost of it
 * @param service loads and temperatures
 * @param criteria what it is judged by
 */
public record Joint(
    Fastener fastener,
    List<Element> elements,
    WasherRule headWasherRule,
    WasherRule nutWasherRule,
    Method method,
    Tightening tightening,
    Service service,
    Criteria criteria) {

  public Joint {
    Objects.requireNonNull(fastener, "fastener");
    elements = List.copyOf(elements);
    Objects.requireNonNull(headWasherRule, "headWasherRule");
    Objects.requireNonNull(nutWasherRule, "nutWasherRule");
    Objects.requireNonNull(method, "method");
    Objects.requireNonNull(tightening, "tightening");
    Objects.requireNonNull(service, "service");
    Objects.requireNonNull(criteria, "criteria");
  }

  /** Thickness of the whole stack [mm]; 0 for an empty one. */
  public double stackThickness() {
    double sum = 0;
    for (Element element : elements) {
      sum += element.thickness();
    }
    return sum;
  }

  /** Whether the element at this index holds the tapped thread. */
  public boolean isTappedLayer(int index) {
    return fastener.isTapped() && index == elements.size() - 1;
  }

  public Joint withFastener(Fastener fastener) {
    return new Joint(
        fastener, elements, headWasherRule, nutWasherRule, method, tightening, service, criteria);
  }

  public Joint withElements(List<Element> elements) {
    return new Joint(
        fastener, elements, headWasherRule, nutWasherRule, method, tightening, service, criteria);
  }

  /** The joint with one element replaced. */
  public Joint withElement(int index, Element element) {
    List<Element> changed = new ArrayList<>(elements);
    changed.set(index, element);
    return withElements(changed);
  }

  public Joint withHeadWasherRule(WasherRule rule) {
    return new Joint(
        fastener, elements, rule, nutWasherRule, method, tightening, service, criteria);
  }

  public Joint withNutWasherRule(WasherRule rule) {
    return new Joint(
        fastener, elements, headWasherRule, rule, method, tightening, service, criteria);
  }

  public Joint withMethod(Method method) {
    return new Joint(
        fastener, elements, headWasherRule, nutWasherRule, method, tightening, service, criteria);
  }

  public Joint withTightening(Tightening tightening) {
    return new Joint(
        fastener, elements, headWasherRule, nutWasherRule, method, tightening, service, criteria);
  }

  public Joint withService(Service service) {
    return new Joint(
        fastener, elements, headWasherRule, nutWasherRule, method, tightening, service, criteria);
  }

  public Joint withCriteria(Criteria criteria) {
    return new Joint(
        fastener, elements, headWasherRule, nutWasherRule, method, tightening, service, criteria);
  }
}
