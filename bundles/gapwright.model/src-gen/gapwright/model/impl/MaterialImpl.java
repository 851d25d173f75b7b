/**
 */
package gapwright.model.impl;

import gapwright.model.Curve;
import gapwright.model.CurveAtTemperature;
import gapwright.model.CurveScaling;
import gapwright.model.GapwrightPackage;
import gapwright.model.InitialPermeability;
import gapwright.model.Material;
import gapwright.model.Saturation;
import gapwright.model.SteinmetzLoss;

import gapwright.model.quantity.Quantity;

import java.util.Collection;

import org.eclipse.emf.common.notify.Notification;
import org.eclipse.emf.common.notify.NotificationChain;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.InternalEObject;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import org.eclipse.emf.ecore.util.EObjectContainmentEList;
import org.eclipse.emf.ecore.util.InternalEList;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Material</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.MaterialImpl#getCurve <em>Curve</em>}</li>
 *   <li>{@link gapwright.model.impl.MaterialImpl#getSaturations <em>Saturations</em>}</li>
 *   <li>{@link gapwright.model.impl.MaterialImpl#getLoss <em>Loss</em>}</li>
 *   <li>{@link gapwright.model.impl.MaterialImpl#getDensity <em>Density</em>}</li>
 *   <li>{@link gapwright.model.impl.MaterialImpl#getSource <em>Source</em>}</li>
 *   <li>{@link gapwright.model.impl.MaterialImpl#getCurveTemperature <em>Curve Temperature</em>}</li>
 *   <li>{@link gapwright.model.impl.MaterialImpl#getCurveScaling <em>Curve Scaling</em>}</li>
 *   <li>{@link gapwright.model.impl.MaterialImpl#getOtherCurves <em>Other Curves</em>}</li>
 *   <li>{@link gapwright.model.impl.MaterialImpl#getPermeabilities <em>Permeabilities</em>}</li>
 *   <li>{@link gapwright.model.impl.MaterialImpl#getCurieTemperature <em>Curie Temperature</em>}</li>
 * </ul>
 *
 * @generated
 */
public class MaterialImpl extends ElementImpl implements Material {
	/**
	 * The cached value of the '{@link #getCurve() <em>Curve</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCurve()
	 * @generated
	 * @ordered
	 */
	protected Curve curve;

	/**
	 * The cached value of the '{@link #getSaturations() <em>Saturations</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSaturations()
	 * @generated
	 * @ordered
	 */
	protected EList<Saturation> saturations;

	/**
	 * The cached value of the '{@link #getLoss() <em>Loss</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLoss()
	 * @generated
	 * @ordered
	 */
	protected SteinmetzLoss loss;

	/**
	 * The default value of the '{@link #getDensity() <em>Density</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDensity()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity DENSITY_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDensity() <em>Density</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDensity()
	 * @generated
	 * @ordered
	 */
	protected Quantity density = DENSITY_EDEFAULT;

	/**
	 * The default value of the '{@link #getSource() <em>Source</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSource()
	 * @generated
	 * @ordered
	 */
	protected static final String SOURCE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getSource() <em>Source</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSource()
	 * @generated
	 * @ordered
	 */
	protected String source = SOURCE_EDEFAULT;

	/**
	 * The default value of the '{@link #getCurveTemperature() <em>Curve Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCurveTemperature()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity CURVE_TEMPERATURE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getCurveTemperature() <em>Curve Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCurveTemperature()
	 * @generated
	 * @ordered
	 */
	protected Quantity curveTemperature = CURVE_TEMPERATURE_EDEFAULT;

	/**
	 * The default value of the '{@link #getCurveScaling() <em>Curve Scaling</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCurveScaling()
	 * @generated
	 * @ordered
	 */
	protected static final CurveScaling CURVE_SCALING_EDEFAULT = CurveScaling.FIXED;

	/**
	 * The cached value of the '{@link #getCurveScaling() <em>Curve Scaling</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCurveScaling()
	 * @generated
	 * @ordered
	 */
	protected CurveScaling curveScaling = CURVE_SCALING_EDEFAULT;

	/**
	 * The cached value of the '{@link #getOtherCurves() <em>Other Curves</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOtherCurves()
	 * @generated
	 * @ordered
	 */
	protected EList<CurveAtTemperature> otherCurves;

	/**
	 * The cached value of the '{@link #getPermeabilities() <em>Permeabilities</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPermeabilities()
	 * @generated
	 * @ordered
	 */
	protected EList<InitialPermeability> permeabilities;

	/**
	 * The default value of the '{@link #getCurieTemperature() <em>Curie Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCurieTemperature()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity CURIE_TEMPERATURE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getCurieTemperature() <em>Curie Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCurieTemperature()
	 * @generated
	 * @ordered
	 */
	protected Quantity curieTemperature = CURIE_TEMPERATURE_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected MaterialImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.MATERIAL;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Curve getCurve() {
		return curve;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetCurve(Curve newCurve, NotificationChain msgs) {
		Curve oldCurve = curve;
		curve = newCurve;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, GapwrightPackage.MATERIAL__CURVE, oldCurve, newCurve);
			if (msgs == null) msgs = notification; else msgs.add(notification);
		}
		return msgs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCurve(Curve newCurve) {
		if (newCurve != curve) {
			NotificationChain msgs = null;
			if (curve != null)
				msgs = ((InternalEObject)curve).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - GapwrightPackage.MATERIAL__CURVE, null, msgs);
			if (newCurve != null)
				msgs = ((InternalEObject)newCurve).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - GapwrightPackage.MATERIAL__CURVE, null, msgs);
			msgs = basicSetCurve(newCurve, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MATERIAL__CURVE, newCurve, newCurve));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Saturation> getSaturations() {
		if (saturations == null) {
			saturations = new EObjectContainmentEList<Saturation>(Saturation.class, this, GapwrightPackage.MATERIAL__SATURATIONS);
		}
		return saturations;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SteinmetzLoss getLoss() {
		return loss;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetLoss(SteinmetzLoss newLoss, NotificationChain msgs) {
		SteinmetzLoss oldLoss = loss;
		loss = newLoss;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, GapwrightPackage.MATERIAL__LOSS, oldLoss, newLoss);
			if (msgs == null) msgs = notification; else msgs.add(notification);
		}
		return msgs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLoss(SteinmetzLoss newLoss) {
		if (newLoss != loss) {
			NotificationChain msgs = null;
			if (loss != null)
				msgs = ((InternalEObject)loss).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - GapwrightPackage.MATERIAL__LOSS, null, msgs);
			if (newLoss != null)
				msgs = ((InternalEObject)newLoss).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - GapwrightPackage.MATERIAL__LOSS, null, msgs);
			msgs = basicSetLoss(newLoss, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MATERIAL__LOSS, newLoss, newLoss));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getDensity() {
		return density;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDensity(Quantity newDensity) {
		Quantity oldDensity = density;
		density = newDensity;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MATERIAL__DENSITY, oldDensity, density));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getSource() {
		return source;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSource(String newSource) {
		String oldSource = source;
		source = newSource;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MATERIAL__SOURCE, oldSource, source));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getCurveTemperature() {
		return curveTemperature;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCurveTemperature(Quantity newCurveTemperature) {
		Quantity oldCurveTemperature = curveTemperature;
		curveTemperature = newCurveTemperature;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MATERIAL__CURVE_TEMPERATURE, oldCurveTemperature, curveTemperature));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public CurveScaling getCurveScaling() {
		return curveScaling;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCurveScaling(CurveScaling newCurveScaling) {
		CurveScaling oldCurveScaling = curveScaling;
		curveScaling = newCurveScaling == null ? CURVE_SCALING_EDEFAULT : newCurveScaling;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MATERIAL__CURVE_SCALING, oldCurveScaling, curveScaling));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<CurveAtTemperature> getOtherCurves() {
		if (otherCurves == null) {
			otherCurves = new EObjectContainmentEList<CurveAtTemperature>(CurveAtTemperature.class, this, GapwrightPackage.MATERIAL__OTHER_CURVES);
		}
		return otherCurves;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<InitialPermeability> getPermeabilities() {
		if (permeabilities == null) {
			permeabilities = new EObjectContainmentEList<InitialPermeability>(InitialPermeability.class, this, GapwrightPackage.MATERIAL__PERMEABILITIES);
		}
		return permeabilities;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getCurieTemperature() {
		return curieTemperature;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCurieTemperature(Quantity newCurieTemperature) {
		Quantity oldCurieTemperature = curieTemperature;
		curieTemperature = newCurieTemperature;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.MATERIAL__CURIE_TEMPERATURE, oldCurieTemperature, curieTemperature));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case GapwrightPackage.MATERIAL__CURVE:
				return basicSetCurve(null, msgs);
			case GapwrightPackage.MATERIAL__SATURATIONS:
				return ((InternalEList<?>)getSaturations()).basicRemove(otherEnd, msgs);
			case GapwrightPackage.MATERIAL__LOSS:
				return basicSetLoss(null, msgs);
			case GapwrightPackage.MATERIAL__OTHER_CURVES:
				return ((InternalEList<?>)getOtherCurves()).basicRemove(otherEnd, msgs);
			case GapwrightPackage.MATERIAL__PERMEABILITIES:
				return ((InternalEList<?>)getPermeabilities()).basicRemove(otherEnd, msgs);
		}
		return super.eInverseRemove(otherEnd, featureID, msgs);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.MATERIAL__CURVE:
				return getCurve();
			case GapwrightPackage.MATERIAL__SATURATIONS:
				return getSaturations();
			case GapwrightPackage.MATERIAL__LOSS:
				return getLoss();
			case GapwrightPackage.MATERIAL__DENSITY:
				return getDensity();
			case GapwrightPackage.MATERIAL__SOURCE:
				return getSource();
			case GapwrightPackage.MATERIAL__CURVE_TEMPERATURE:
				return getCurveTemperature();
			case GapwrightPackage.MATERIAL__CURVE_SCALING:
				return getCurveScaling();
			case GapwrightPackage.MATERIAL__OTHER_CURVES:
				return getOtherCurves();
			case GapwrightPackage.MATERIAL__PERMEABILITIES:
				return getPermeabilities();
			case GapwrightPackage.MATERIAL__CURIE_TEMPERATURE:
				return getCurieTemperature();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@SuppressWarnings("unchecked")
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case GapwrightPackage.MATERIAL__CURVE:
				setCurve((Curve)newValue);
				return;
			case GapwrightPackage.MATERIAL__SATURATIONS:
				getSaturations().clear();
				getSaturations().addAll((Collection<? extends Saturation>)newValue);
				return;
			case GapwrightPackage.MATERIAL__LOSS:
				setLoss((SteinmetzLoss)newValue);
				return;
			case GapwrightPackage.MATERIAL__DENSITY:
				setDensity((Quantity)newValue);
				return;
			case GapwrightPackage.MATERIAL__SOURCE:
				setSource((String)newValue);
				return;
			case GapwrightPackage.MATERIAL__CURVE_TEMPERATURE:
				setCurveTemperature((Quantity)newValue);
				return;
			case GapwrightPackage.MATERIAL__CURVE_SCALING:
				setCurveScaling((CurveScaling)newValue);
				return;
			case GapwrightPackage.MATERIAL__OTHER_CURVES:
				getOtherCurves().clear();
				getOtherCurves().addAll((Collection<? extends CurveAtTemperature>)newValue);
				return;
			case GapwrightPackage.MATERIAL__PERMEABILITIES:
				getPermeabilities().clear();
				getPermeabilities().addAll((Collection<? extends InitialPermeability>)newValue);
				return;
			case GapwrightPackage.MATERIAL__CURIE_TEMPERATURE:
				setCurieTemperature((Quantity)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case GapwrightPackage.MATERIAL__CURVE:
				setCurve((Curve)null);
				return;
			case GapwrightPackage.MATERIAL__SATURATIONS:
				getSaturations().clear();
				return;
			case GapwrightPackage.MATERIAL__LOSS:
				setLoss((SteinmetzLoss)null);
				return;
			case GapwrightPackage.MATERIAL__DENSITY:
				setDensity(DENSITY_EDEFAULT);
				return;
			case GapwrightPackage.MATERIAL__SOURCE:
				setSource(SOURCE_EDEFAULT);
				return;
			case GapwrightPackage.MATERIAL__CURVE_TEMPERATURE:
				setCurveTemperature(CURVE_TEMPERATURE_EDEFAULT);
				return;
			case GapwrightPackage.MATERIAL__CURVE_SCALING:
				setCurveScaling(CURVE_SCALING_EDEFAULT);
				return;
			case GapwrightPackage.MATERIAL__OTHER_CURVES:
				getOtherCurves().clear();
				return;
			case GapwrightPackage.MATERIAL__PERMEABILITIES:
				getPermeabilities().clear();
				return;
			case GapwrightPackage.MATERIAL__CURIE_TEMPERATURE:
				setCurieTemperature(CURIE_TEMPERATURE_EDEFAULT);
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case GapwrightPackage.MATERIAL__CURVE:
				return curve != null;
			case GapwrightPackage.MATERIAL__SATURATIONS:
				return saturations != null && !saturations.isEmpty();
			case GapwrightPackage.MATERIAL__LOSS:
				return loss != null;
			case GapwrightPackage.MATERIAL__DENSITY:
				return DENSITY_EDEFAULT == null ? density != null : !DENSITY_EDEFAULT.equals(density);
			case GapwrightPackage.MATERIAL__SOURCE:
				return SOURCE_EDEFAULT == null ? source != null : !SOURCE_EDEFAULT.equals(source);
			case GapwrightPackage.MATERIAL__CURVE_TEMPERATURE:
				return CURVE_TEMPERATURE_EDEFAULT == null ? curveTemperature != null : !CURVE_TEMPERATURE_EDEFAULT.equals(curveTemperature);
			case GapwrightPackage.MATERIAL__CURVE_SCALING:
				return curveScaling != CURVE_SCALING_EDEFAULT;
			case GapwrightPackage.MATERIAL__OTHER_CURVES:
				return otherCurves != null && !otherCurves.isEmpty();
			case GapwrightPackage.MATERIAL__PERMEABILITIES:
				return permeabilities != null && !permeabilities.isEmpty();
			case GapwrightPackage.MATERIAL__CURIE_TEMPERATURE:
				return CURIE_TEMPERATURE_EDEFAULT == null ? curieTemperature != null : !CURIE_TEMPERATURE_EDEFAULT.equals(curieTemperature);
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (density: ");
		result.append(density);
		result.append(", source: ");
		result.append(source);
		result.append(", curveTemperature: ");
		result.append(curveTemperature);
		result.append(", curveScaling: ");
		result.append(curveScaling);
		result.append(", curieTemperature: ");
		result.append(curieTemperature);
		result.append(')');
		return result.toString();
	}

} //MaterialImpl
