/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Material</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * What a leg is made of.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Material#getCurve <em>Curve</em>}</li>
 *   <li>{@link gapwright.model.Material#getSaturations <em>Saturations</em>}</li>
 *   <li>{@link gapwright.model.Material#getLoss <em>Loss</em>}</li>
 *   <li>{@link gapwright.model.Material#getDensity <em>Density</em>}</li>
 *   <li>{@link gapwright.model.Material#getSource <em>Source</em>}</li>
 *   <li>{@link gapwright.model.Material#getCurveTemperature <em>Curve Temperature</em>}</li>
 *   <li>{@link gapwright.model.Material#getCurveScaling <em>Curve Scaling</em>}</li>
 *   <li>{@link gapwright.model.Material#getOtherCurves <em>Other Curves</em>}</li>
 *   <li>{@link gapwright.model.Material#getPermeabilities <em>Permeabilities</em>}</li>
 *   <li>{@link gapwright.model.Material#getCurieTemperature <em>Curie Temperature</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getMaterial()
 * @model
 * @generated
 */
public interface Material extends Element {
	/**
	 * Returns the value of the '<em><b>Curve</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Flux density against field strength.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Curve</em>' containment reference.
	 * @see #setCurve(Curve)
	 * @see gapwright.model.GapwrightPackage#getMaterial_Curve()
	 * @model containment="true" required="true"
	 * @generated
	 */
	Curve getCurve();

	/**
	 * Sets the value of the '{@link gapwright.model.Material#getCurve <em>Curve</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Curve</em>' containment reference.
	 * @see #getCurve()
	 * @generated
	 */
	void setCurve(Curve value);

	/**
	 * Returns the value of the '<em><b>Saturations</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.Saturation}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Saturation flux density against temperature; points in any order.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Saturations</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getMaterial_Saturations()
	 * @model containment="true"
	 * @generated
	 */
	EList<Saturation> getSaturations();

	/**
	 * Returns the value of the '<em><b>Loss</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Loss</em>' containment reference.
	 * @see #setLoss(SteinmetzLoss)
	 * @see gapwright.model.GapwrightPackage#getMaterial_Loss()
	 * @model containment="true"
	 * @generated
	 */
	SteinmetzLoss getLoss();

	/**
	 * Sets the value of the '{@link gapwright.model.Material#getLoss <em>Loss</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Loss</em>' containment reference.
	 * @see #getLoss()
	 * @generated
	 */
	void setLoss(SteinmetzLoss value);

	/**
	 * Returns the value of the '<em><b>Density</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Density</em>' attribute.
	 * @see #setDensity(Quantity)
	 * @see gapwright.model.GapwrightPackage#getMaterial_Density()
	 * @model dataType="gapwright.model.Density"
	 * @generated
	 */
	Quantity getDensity();

	/**
	 * Sets the value of the '{@link gapwright.model.Material#getDensity <em>Density</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Density</em>' attribute.
	 * @see #getDensity()
	 * @generated
	 */
	void setDensity(Quantity value);

	/**
	 * Returns the value of the '<em><b>Source</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Where its numbers come from.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Source</em>' attribute.
	 * @see #setSource(String)
	 * @see gapwright.model.GapwrightPackage#getMaterial_Source()
	 * @model
	 * @generated
	 */
	String getSource();

	/**
	 * Sets the value of the '{@link gapwright.model.Material#getSource <em>Source</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Source</em>' attribute.
	 * @see #getSource()
	 * @generated
	 */
	void setSource(String value);

	/**
	 * Returns the value of the '<em><b>Curve Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Temperature the curve holds at; left out: 25 °C.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Curve Temperature</em>' attribute.
	 * @see #setCurveTemperature(Quantity)
	 * @see gapwright.model.GapwrightPackage#getMaterial_CurveTemperature()
	 * @model dataType="gapwright.model.Temperature"
	 * @generated
	 */
	Quantity getCurveTemperature();

	/**
	 * Sets the value of the '{@link gapwright.model.Material#getCurveTemperature <em>Curve Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Curve Temperature</em>' attribute.
	 * @see #getCurveTemperature()
	 * @generated
	 */
	void setCurveTemperature(Quantity value);

	/**
	 * Returns the value of the '<em><b>Curve Scaling</b></em>' attribute.
	 * The literals are from the enumeration {@link gapwright.model.CurveScaling}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What becomes of the curve at other temperatures.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Curve Scaling</em>' attribute.
	 * @see gapwright.model.CurveScaling
	 * @see #setCurveScaling(CurveScaling)
	 * @see gapwright.model.GapwrightPackage#getMaterial_CurveScaling()
	 * @model
	 * @generated
	 */
	CurveScaling getCurveScaling();

	/**
	 * Sets the value of the '{@link gapwright.model.Material#getCurveScaling <em>Curve Scaling</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Curve Scaling</em>' attribute.
	 * @see gapwright.model.CurveScaling
	 * @see #getCurveScaling()
	 * @generated
	 */
	void setCurveScaling(CurveScaling value);

	/**
	 * Returns the value of the '<em><b>Other Curves</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.CurveAtTemperature}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The curve at further temperatures; in between the field strength is interpolated at each flux density.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Other Curves</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getMaterial_OtherCurves()
	 * @model containment="true"
	 * @generated
	 */
	EList<CurveAtTemperature> getOtherCurves();

	/**
	 * Returns the value of the '<em><b>Permeabilities</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.InitialPermeability}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Initial permeability by temperature; replaces the one of the curve.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Permeabilities</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getMaterial_Permeabilities()
	 * @model containment="true"
	 * @generated
	 */
	EList<InitialPermeability> getPermeabilities();

	/**
	 * Returns the value of the '<em><b>Curie Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Temperature at which the material stops being magnetic.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Curie Temperature</em>' attribute.
	 * @see #setCurieTemperature(Quantity)
	 * @see gapwright.model.GapwrightPackage#getMaterial_CurieTemperature()
	 * @model dataType="gapwright.model.Temperature"
	 * @generated
	 */
	Quantity getCurieTemperature();

	/**
	 * Sets the value of the '{@link gapwright.model.Material#getCurieTemperature <em>Curie Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Curie Temperature</em>' attribute.
	 * @see #getCurieTemperature()
	 * @generated
	 */
	void setCurieTemperature(Quantity value);

} // Material
