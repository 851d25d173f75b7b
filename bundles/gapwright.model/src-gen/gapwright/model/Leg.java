/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Leg</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A bar of iron between two joints. Flux is positive from from to to.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Leg#getFrom <em>From</em>}</li>
 *   <li>{@link gapwright.model.Leg#getTo <em>To</em>}</li>
 *   <li>{@link gapwright.model.Leg#getMaterial <em>Material</em>}</li>
 *   <li>{@link gapwright.model.Leg#getShape <em>Shape</em>}</li>
 *   <li>{@link gapwright.model.Leg#getWidth <em>Width</em>}</li>
 *   <li>{@link gapwright.model.Leg#getDepth <em>Depth</em>}</li>
 *   <li>{@link gapwright.model.Leg#getDiameter <em>Diameter</em>}</li>
 *   <li>{@link gapwright.model.Leg#getArea <em>Area</em>}</li>
 *   <li>{@link gapwright.model.Leg#getStackingFactor <em>Stacking Factor</em>}</li>
 *   <li>{@link gapwright.model.Leg#getPathLength <em>Path Length</em>}</li>
 *   <li>{@link gapwright.model.Leg#getGaps <em>Gaps</em>}</li>
 *   <li>{@link gapwright.model.Leg#getMagnet <em>Magnet</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getLeg()
 * @model
 * @generated
 */
public interface Leg extends Element {
	/**
	 * Returns the value of the '<em><b>From</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>From</em>' reference.
	 * @see #setFrom(Joint)
	 * @see gapwright.model.GapwrightPackage#getLeg_From()
	 * @model resolveProxies="false" required="true"
	 * @generated
	 */
	Joint getFrom();

	/**
	 * Sets the value of the '{@link gapwright.model.Leg#getFrom <em>From</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>From</em>' reference.
	 * @see #getFrom()
	 * @generated
	 */
	void setFrom(Joint value);

	/**
	 * Returns the value of the '<em><b>To</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>To</em>' reference.
	 * @see #setTo(Joint)
	 * @see gapwright.model.GapwrightPackage#getLeg_To()
	 * @model resolveProxies="false" required="true"
	 * @generated
	 */
	Joint getTo();

	/**
	 * Sets the value of the '{@link gapwright.model.Leg#getTo <em>To</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>To</em>' reference.
	 * @see #getTo()
	 * @generated
	 */
	void setTo(Joint value);

	/**
	 * Returns the value of the '<em><b>Material</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Material</em>' reference.
	 * @see #setMaterial(Material)
	 * @see gapwright.model.GapwrightPackage#getLeg_Material()
	 * @model resolveProxies="false" required="true"
	 * @generated
	 */
	Material getMaterial();

	/**
	 * Sets the value of the '{@link gapwright.model.Leg#getMaterial <em>Material</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Material</em>' reference.
	 * @see #getMaterial()
	 * @generated
	 */
	void setMaterial(Material value);

	/**
	 * Returns the value of the '<em><b>Shape</b></em>' attribute.
	 * The literals are from the enumeration {@link gapwright.model.SectionShape}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Which of the dimensions below describe the cross-section.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Shape</em>' attribute.
	 * @see gapwright.model.SectionShape
	 * @see #setShape(SectionShape)
	 * @see gapwright.model.GapwrightPackage#getLeg_Shape()
	 * @model
	 * @generated
	 */
	SectionShape getShape();

	/**
	 * Sets the value of the '{@link gapwright.model.Leg#getShape <em>Shape</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Shape</em>' attribute.
	 * @see gapwright.model.SectionShape
	 * @see #getShape()
	 * @generated
	 */
	void setShape(SectionShape value);

	/**
	 * Returns the value of the '<em><b>Width</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * RECTANGULAR: side across the bar, on the page.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Width</em>' attribute.
	 * @see #setWidth(Quantity)
	 * @see gapwright.model.GapwrightPackage#getLeg_Width()
	 * @model dataType="gapwright.model.Length"
	 * @generated
	 */
	Quantity getWidth();

	/**
	 * Sets the value of the '{@link gapwright.model.Leg#getWidth <em>Width</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Width</em>' attribute.
	 * @see #getWidth()
	 * @generated
	 */
	void setWidth(Quantity value);

	/**
	 * Returns the value of the '<em><b>Depth</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * RECTANGULAR: side into the page.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Depth</em>' attribute.
	 * @see #setDepth(Quantity)
	 * @see gapwright.model.GapwrightPackage#getLeg_Depth()
	 * @model dataType="gapwright.model.Length"
	 * @generated
	 */
	Quantity getDepth();

	/**
	 * Sets the value of the '{@link gapwright.model.Leg#getDepth <em>Depth</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Depth</em>' attribute.
	 * @see #getDepth()
	 * @generated
	 */
	void setDepth(Quantity value);

	/**
	 * Returns the value of the '<em><b>Diameter</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * ROUND: diameter of the section.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Diameter</em>' attribute.
	 * @see #setDiameter(Quantity)
	 * @see gapwright.model.GapwrightPackage#getLeg_Diameter()
	 * @model dataType="gapwright.model.Length"
	 * @generated
	 */
	Quantity getDiameter();

	/**
	 * Sets the value of the '{@link gapwright.model.Leg#getDiameter <em>Diameter</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Diameter</em>' attribute.
	 * @see #getDiameter()
	 * @generated
	 */
	void setDiameter(Quantity value);

	/**
	 * Returns the value of the '<em><b>Area</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * GIVEN: gross area of the section; drawn as wide as its root.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Area</em>' attribute.
	 * @see #setArea(Quantity)
	 * @see gapwright.model.GapwrightPackage#getLeg_Area()
	 * @model dataType="gapwright.model.Area"
	 * @generated
	 */
	Quantity getArea();

	/**
	 * Sets the value of the '{@link gapwright.model.Leg#getArea <em>Area</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Area</em>' attribute.
	 * @see #getArea()
	 * @generated
	 */
	void setArea(Quantity value);

	/**
	 * Returns the value of the '<em><b>Stacking Factor</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Iron area over gross area, above 0 to 1.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Stacking Factor</em>' attribute.
	 * @see #setStackingFactor(double)
	 * @see gapwright.model.GapwrightPackage#getLeg_StackingFactor()
	 * @model default="1"
	 * @generated
	 */
	double getStackingFactor();

	/**
	 * Sets the value of the '{@link gapwright.model.Leg#getStackingFactor <em>Stacking Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Stacking Factor</em>' attribute.
	 * @see #getStackingFactor()
	 * @generated
	 */
	void setStackingFactor(double value);

	/**
	 * Returns the value of the '<em><b>Path Length</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Length of the path in iron; left out: joint distance less the lengths of gaps and magnet.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Path Length</em>' attribute.
	 * @see #setPathLength(Quantity)
	 * @see gapwright.model.GapwrightPackage#getLeg_PathLength()
	 * @model dataType="gapwright.model.Length"
	 * @generated
	 */
	Quantity getPathLength();

	/**
	 * Sets the value of the '{@link gapwright.model.Leg#getPathLength <em>Path Length</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Path Length</em>' attribute.
	 * @see #getPathLength()
	 * @generated
	 */
	void setPathLength(Quantity value);

	/**
	 * Returns the value of the '<em><b>Gaps</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.Gap}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Gaps</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getLeg_Gaps()
	 * @model containment="true"
	 * @generated
	 */
	EList<Gap> getGaps();

	/**
	 * Returns the value of the '<em><b>Magnet</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Magnet</em>' containment reference.
	 * @see #setMagnet(Magnet)
	 * @see gapwright.model.GapwrightPackage#getLeg_Magnet()
	 * @model containment="true"
	 * @generated
	 */
	Magnet getMagnet();

	/**
	 * Sets the value of the '{@link gapwright.model.Leg#getMagnet <em>Magnet</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Magnet</em>' containment reference.
	 * @see #getMagnet()
	 * @generated
	 */
	void setMagnet(Magnet value);

} // Leg
